import 'server-only';
import { faultOfNewPassword } from '@/lib/domain/people/new-password';
import { AppError, type ErrorCode } from '@/lib/http/errors';
import type { Person } from '@/lib/server/actor';
import { checkSignIn, type SignInResult } from '@/lib/server/check-sign-in';
import { inTransaction } from '@/lib/server/database';
import { hashPassword } from '@/lib/server/password';
import { endAllSessions, startSession, type SessionClaims } from '@/lib/server/session';
import { PersonRow } from '@/models/person';
import type { ChangePasswordInput } from '../schema';

const refuse = (code: ErrorCode, field: keyof ChangePasswordInput, reason: string): AppError =>
  new AppError(code, `${reason} Your password is still the old one.`, { fields: [{ field, reason }] });

const mustBeRight = (result: SignInResult): void => {
  if (result.kind === 'wrong') throw refuse('invalid', 'current', 'This is not the password that you sign in with now.');
  if (result.kind === 'right') return;
  const minutes = Math.max(1, Math.ceil(result.seconds / 60));
  throw new AppError('too-many', `There were too many wrong passwords, so none is looked at for now. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again.`, { retryAfterSeconds: result.seconds });
};

/**
 * Gives a person another password and ends every session there is of theirs.
 *
 * @param address where the request came from, for the slow-down
 * @returns a new session, for the browser that asked
 */
export const changePassword = async (person: Person, { current, wanted }: ChangePasswordInput, address: string): Promise<SessionClaims> => {
  const fault = faultOfNewPassword(wanted, person);
  if (fault !== null) throw refuse('invalid', 'wanted', fault);
  if (wanted === current) throw refuse('invalid', 'wanted', 'This is the password that you have now. Choose another.');
  mustBeRight(await checkSignIn(person.email, current, address));
  const passwordHash = await hashPassword(wanted);
  const sessionVersion = await inTransaction(async (transaction) => {
    await PersonRow.update({ passwordHash }, { where: { id: person.id }, transaction });
    await endAllSessions(person.id, transaction);
    return (await PersonRow.findByPk(person.id, { transaction }))?.sessionVersion ?? 0;
  });
  return startSession({ id: person.id, sessionVersion });
};
