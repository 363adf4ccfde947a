import { commonWords } from './common-passwords';

/** Characters. Length is what makes a password hard to guess, so nothing else is asked of it (NIST SP 800-63B 3.1.1.2: no rules of composition). */
export const shortestPassword = 12;
export const longestPassword = 256;

/** What is known of the person whose password it is to be. */
export type PasswordOwner = { readonly name: string; readonly email: string };

const lettersOf = (text: string): string => text.normalize('NFKC').toLowerCase().replace(/[^\p{L}]/gu, '');

/** "abcabc" is "abc" said twice. */
const saidOnce = (text: string): string => /^(.+?)\1*$/u.exec(text)?.[1] ?? text;

const runs = ['01234567890123456789', '98765432109876543210'];

const isRun = (text: string): boolean => runs.some((run) => run.includes(text)) || new Set(text).size < 5;

const isTheirs = (letters: string, { name, email }: PasswordOwner): boolean =>
  [name, email, email.split('@')[0] ?? ''].map(lettersOf).some((own) => own !== '' && saidOnce(letters) === saidOnce(own));

/** Why it cannot be somebody's new password, in words; null when it can. */
export const faultOfNewPassword = (password: string, owner: PasswordOwner): string | null => {
  const length = [...password].length;
  if (length < shortestPassword) return `A password has at least ${shortestPassword} characters; this one has ${length}. A few words in a row are easy to keep in mind.`;
  if (length > longestPassword) return `A password has at most ${longestPassword} characters.`;
  const letters = lettersOf(password);
  if (isRun(password) || commonWords.has(letters) || commonWords.has(saidOnce(letters))) return 'This password is among those that are tried first. Choose one that nobody else would think of.';
  return isTheirs(letters, owner) ? 'A password made of your own name or address is guessed at once. Choose another.' : null;
};
