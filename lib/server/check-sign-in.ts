import 'server-only';
import { PersonRow } from '@/models/person';
import { passwordMatches } from './password';
import { countWrongPassword, forgetWrongPasswords, secondsToWait } from './slow-down';

export type SignInResult =
  | { readonly kind: 'right'; readonly person: { readonly id: string; readonly sessionVersion: number } }
  | { readonly kind: 'wrong' }
  | { readonly kind: 'wait'; readonly seconds: number };

/** No password is longer; more would only be work for the hash. */
const longestPassword = 256;

/** Checks an email and a password. An unknown person and a wrong password give the same answer after the same work. */
export const checkSignIn = async (email: string, password: string, from: string): Promise<SignInResult> => {
  const seconds = await secondsToWait(email, from);
  if (seconds > 0) return { kind: 'wait', seconds };
  const person = await PersonRow.findOne({ where: { email: email.trim().slice(0, 254) } });
  const matches = await passwordMatches(person?.passwordHash ?? null, password.slice(0, longestPassword));
  if (person === null || !matches) {
    await countWrongPassword(email, from);
    return { kind: 'wrong' };
  }
  await forgetWrongPasswords(email);
  return { kind: 'right', person: { id: person.id, sessionVersion: person.sessionVersion } };
};
