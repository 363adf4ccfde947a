import 'server-only';
import { BaseError, ConnectionError, DatabaseError, ForeignKeyConstraintError, UniqueConstraintError } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { log } from './log';
import { RowMissing, StaleWrite } from './versioned-update';

const staleError = ({ lastChange: changed, current }: StaleWrite): AppError =>
  new AppError('stale', `${changed === null ? 'Somebody else' : changed.by} changed this since you opened it${changed === null ? '' : `: ${changed.summary}`}. Nothing of yours was saved, and nothing you typed is lost. Look at what changed, then save again.`, {
    changed, current,
  });

const isDown = (error: BaseError): boolean =>
  error instanceof ConnectionError || (error instanceof DatabaseError && /ECONNREFUSED|connection|socket/i.test(error.message));

/** Turns whatever was thrown into a refusal with a sentence; what nobody expected is logged once and told without details. */
export const asAppError = async (error: unknown): Promise<AppError> => {
  if (error instanceof AppError) return error;
  if (error instanceof StaleWrite) return staleError(error);
  if (error instanceof RowMissing) return new AppError('not-found', 'It is not there any more: somebody may have deleted it. Nothing was changed. Reload the page to see what is there now.');
  if (error instanceof UniqueConstraintError) {
    const value = error.errors[0]?.value;
    return new AppError('conflict', `${value === undefined || value === null ? 'That' : `“${String(value)}”`} is taken already on this site. Nothing was changed. Choose another.`, {
      fields: error.errors.flatMap((one) => (one.path === null ? [] : [{ field: one.path, reason: 'Taken already on this site.' }])),
    });
  }
  if (error instanceof ForeignKeyConstraintError) {
    return new AppError('conflict', 'Something else still uses this, or it refers to something that is not on this site. Nothing was changed. Take it out of use there first.');
  }
  if (error instanceof BaseError && isDown(error)) {
    log.error({ name: error.name }, 'the database cannot be reached');
    return new AppError('unavailable', 'The database cannot be reached, so nothing was saved. The tills print as before. Try again in a moment.', { retryAfterSeconds: 5 });
  }
  log.error({ error: error instanceof Error ? { name: error.name, message: error.message, stack: error.stack } : String(error) }, 'unexpected');
  return new AppError('bug', 'Something broke that should not have, and nothing was saved. Nothing on the tills changes. Try again; if it happens again, tell whoever looks after Tamis.');
};
