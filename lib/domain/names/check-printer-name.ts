import { bySeverity, type Finding, type Severity } from '../findings/finding';
import { equalRival, lookAlikeRival, misleadingStation, suggestFor, type NameContext } from './name-context';
import { invisible, isReservedName, longestNameBytes, nameBytes, nonAscii, refusedCharacters, whiteSpace } from './name-limits';
import { policyAllows, policyBreaches, sayPolicy } from './naming-policy';

type CharacterFault = 'space' | 'invisible' | 'refused' | 'non-ascii';

const faultOf = (character: string): CharacterFault | null => {
  if (whiteSpace.test(character)) return 'space';
  if (invisible.test(character)) return 'invisible';
  if (refusedCharacters.has(character)) return 'refused';
  return nonAscii.test(character) ? 'non-ascii' : null;
};

const codePoint = (character: string): string => `U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;

/** A name with what cannot be seen written out, so that a sentence about it can be read. */
export const visibleName = (name: string): string =>
  [...name].map((character) => (character !== ' ' && (faultOf(character) === 'space' || faultOf(character) === 'invisible') ? `[${codePoint(character)}]` : character)).join('');

type Judged = { readonly name: string; readonly shown: string; readonly context: NameContext; readonly faulty: (fault: CharacterFault) => readonly string[] };

type NameRule = {
  readonly code: string;
  readonly severity: Severity;
  /** Title and message when the rule applies, else null. */
  readonly say: (judged: Judged) => readonly [string, string] | null;
};

const rules: readonly NameRule[] = [
  {
    code: 'name-empty', severity: 'stop',
    say: ({ name }) => (name === '' ? ['A printer has no name', 'Its name is how every till knows it.'] : null),
  },
  {
    code: 'name-space', severity: 'stop',
    say: ({ name, shown, faulty }) => {
      const [first] = faulty('space');
      if (first === undefined) return null;
      const outside = name.trim() !== name && !/\s/u.test(name.trim());
      const what = first === ' ' ? 'a space' : 'white space';
      return [outside ? `${visibleName(name.trim()) || 'A printer'} has ${what} before or after its name` : `${shown} has ${what} in its name`,
        'Some ordering software cannot print to it. It must read the same on all tills.'];
    },
  },
  {
    code: 'name-invisible', severity: 'stop',
    say: ({ shown, faulty }) => {
      const [first] = faulty('invisible');
      return first === undefined ? null
        : [`${shown} has a character in its name that nobody can see`, `${codePoint(first)} makes it a different name from one that looks the same, and nobody can type it.`];
    },
  },
  {
    code: 'name-refused', severity: 'stop',
    say: ({ shown, faulty }) => {
      const [first] = faulty('refused');
      return first === undefined ? null
        : [`${shown} has ${first} in its name`, `${refusedCharacters.get(first) ?? 'It is refused'}, so some tills cannot have a printer of this name.`];
    },
  },
  {
    code: 'name-reserved', severity: 'stop',
    say: ({ name }) => (isReservedName(name) ? [`${name} is a name that Windows keeps for itself`, 'A till with Windows takes it for one of its own sockets, and nothing prints.'] : null),
  },
  {
    code: 'name-too-long', severity: 'stop',
    say: ({ name, shown }) => (nameBytes(name) > longestNameBytes
      ? [`${shown} is too long for a printer name`, `It takes ${nameBytes(name)} bytes; from ${longestNameBytes + 1} on, some tills cut it or refuse it.`] : null),
  },
  {
    code: 'name-taken', severity: 'stop',
    say: ({ name, shown, context }) => {
      const rival = name === '' ? undefined : equalRival(name, context);
      return rival === undefined ? null
        : [`Two printers are called ${shown}`, 'Tills do not tell capitals from small letters, so tickets for one come out on the other.'];
    },
  },
  {
    code: 'name-looks-alike', severity: 'check',
    say: ({ name, shown, context }) => {
      const rival = lookAlikeRival(name, context);
      return rival === undefined ? null : [`${shown} looks the same as ${rival}`, 'O and 0, or l, I and 1, are easily mistaken for each other when the name is typed on a till.'];
    },
  },
  {
    code: 'name-not-ascii', severity: 'check',
    say: ({ shown, faulty }) => {
      const [first] = faulty('non-ascii');
      return first === undefined ? null : [`${shown} has ${first} in its name`, 'Not every keyboard has it and not every system stores it the same way, so the name may not match on all tills.'];
    },
  },
  {
    code: 'name-outside-policy', severity: 'check',
    say: ({ name, shown, context }) => {
      const breaches = policyBreaches(context.policy, name).filter((breach) => {
        if (name === '') return false;
        if (breach === 'long') return nameBytes(name) <= longestNameBytes;
        if (breach === 'start') return faultOf([...name][0] ?? '') === null;
        return breach !== 'character' || [...name].some((character) => faultOf(character) === null && !policyAllows(context.policy, character));
      });
      return breaches.length === 0 ? null : [`${shown} is not how this site names its printers`, `Here a printer name is ${sayPolicy(context.policy)}.`];
    },
  },
  {
    code: 'name-of-other-station', severity: 'check',
    say: ({ name, shown, context }) => {
      const station = misleadingStation(name, context);
      return station === undefined ? null
        : [`${shown} does not print for ${station}`, `It prints for ${context.ownStations.join(' and ')}. Whoever reads the name looks for the ticket at ${station}.`];
    },
  },
];

/**
 * All there is to say of one printer name, worst first. Each finding offers a name that passes every rule and that
 * no other printer of the site has.
 */
export const checkPrinterName = (name: string, context: NameContext): readonly Finding[] => {
  const characters = [...name];
  const judged: Judged = { name, shown: visibleName(name), context, faulty: (fault) => characters.filter((character) => faultOf(character) === fault) };
  const said = rules.flatMap((rule) => {
    const words = rule.say(judged);
    return words === null ? [] : [{ rule, words }];
  });
  if (said.length === 0) return [];
  const better = suggestFor(name, context);
  return bySeverity(said.map(({ rule, words: [title, message] }): Finding => ({
    code: rule.code, severity: rule.severity, subject: { kind: 'printer', id: context.id, field: 'name' }, title, message,
    fixes: [{ kind: 'rename-printer', printer: context.id, name: better, label: name === '' ? `Name it ${better}` : `Rename to ${better}` }],
  })));
};

/** Whether a name has nothing to be said of it. */
export const isGoodPrinterName = (name: string, context: NameContext): boolean => checkPrinterName(name, context).length === 0;
