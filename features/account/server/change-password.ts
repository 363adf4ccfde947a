import 'server-only';
import { AppError } from '@/lib/http/errors';
import type { Person } from '@/lib/server/actor';
import { inTransaction } from '@/lib/server/database';
import { hashPassword, passwordMatches } from '@/lib/server/password';
import { endAllSessions } from '@/lib/server/session';
import { countWrongPassword, secondsToWait } from '@/lib/server/slow-down';
import { PersonRow } from '@/models/person';
import type { PasswordInput } from '../schema';

/** Changes a person's own password and ends every session of theirs at once, this one included. */
export const changePassword = async (person: Person, { current, next }: PasswordInput): Promise<{ readonly changed: true }> => {
  const wait = await secondsToWait(person.email, person.id);
  if (wait > 0) throw new AppError('too-many', `There were too many wrong passwords. Nothing was changed. Wait ${Math.ceil(wait / 60)} minutes, then try again.`, { retryAfterSeconds: wait });
  const row = await PersonRow.findByPk(person.id);
  if (!(await passwordMatches(row?.passwordHash ?? null, current))) {
    await countWrongPassword(person.email, person.id);
    throw new AppError('invalid', 'The present password is not right. Nothing was changed.', { fields: [{ field: 'current', reason: 'Not the present password.' }] });
  }
  const passwordHash = await hashPassword(next);
  await inTransaction(async (transaction) => {
    await PersonRow.update({ passwordHash }, { where: { id: person.id }, transaction });
    await endAllSessions(person.id, transaction);
  });
  return { changed: true };
};
