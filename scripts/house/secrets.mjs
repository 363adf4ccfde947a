import { randomBytes, randomInt } from 'node:crypto';
import { keep, readKept } from './keep-json.mjs';
import { Sentence } from './sentence.mjs';

/** Words that cannot be misheard or mistyped; four of them and two digits are 50 bits. */
const syllables = ['ba', 'de', 'fi', 'go', 'ku', 'la', 'me', 'ni', 'po', 'ru', 'sa', 'te', 'vi', 'wo', 'zu', 'ha', 'ke', 'li', 'mo', 'nu', 'pa', 're', 'si', 'to', 'fu', 'ga', 'be', 'di', 'lo', 'mu', 'ra', 'ze'];

const word = () => Array.from({ length: 3 }, () => syllables[randomInt(syllables.length)]).join('');

const makers = {
  sessionSecret: () => randomBytes(48).toString('base64url'),
  databasePassword: () => randomBytes(24).toString('base64url'),
  demoPassword: () => `${word()}-${word()}-${word()}-${randomInt(10, 100)}`,
};

/** Made at the first start and kept; one that a later version adds is made when it is first asked for. */
export function openSecrets(home) {
  const kept = readKept(home.secrets) ?? {};
  const isSound = Object.values(kept).every((value) => typeof value === 'string' && value.length > 7);
  if (!isSound) throw new Sentence(`${home.secrets} holds something that is no secret of Tamis; put back a copy of it and start again.`);
  const secrets = Object.fromEntries(Object.entries(makers).map(([name, make]) => [name, kept[name] ?? make()]));
  if (Object.keys(secrets).some((name) => kept[name] === undefined)) keep(home.secrets, { ...kept, ...secrets });
  return secrets;
}
