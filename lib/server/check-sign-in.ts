import 'server-only';
import { PersonRow } from '@/models/person';
import { passwordMatches } from './password';
import { countTry, forgiveTries } from './slow-down';

export type SignInResult =
  | { readonly kind: 'right'; readonly person: { readonly id: string; readonly sessionVersion: number } }
  | { readonly kind: 'wrong' }
  | { readonly kind: 'wait'; readonly seconds: number };

const longestEmail = 254;

/** No password is longer; more would only be work for the hash. */
const longestPassword = 256;

/** How an e-mail address is compared: as typed, without case. */
export const foldEmail = (email: string): string => email.trim().toLowerCase();

/** The table takes more spellings for equal than people do; another spelling must not count its tries apart. */
const personWithEmail = async (email: string): Promise<PersonRow | null> => {
  const row = await PersonRow.findOne({ where: { email } });
  return row !== null && foldEmail(row.email) === email ? row : null;
};

/** Checks an email and a password. An unknown person and a wrong password give the same answer after the same work. */
export const checkSignIn = async (typedEmail: string, password: string, address: string): Promise<SignInResult> => {
  const email = foldEmail(typedEmail.slice(0, longestEmail));
  const seconds = await countTry({ email, address });
  if (seconds > 0) return { kind: 'wait', seconds };
  const person = await personWithEmail(email);
  const matches = await passwordMatches(person?.passwordHash ?? null, password.slice(0, longestPassword));
  if (person === null || !matches) return { kind: 'wrong' };
  await forgiveTries({ email, address });
  return { kind: 'right', person: { id: person.id, sessionVersion: person.sessionVersion } };
};
