import 'server-only';
import type { Sequelize, Transaction } from 'sequelize';
import { defineAll } from '@/models/define-all';
import { closeSharedConnection, makeConnection, sharedConnection } from '@/models/shared-connection';

/** A pool of its own, with the models tied to it: for tests that want a pool of one. */
export const connect = (url: string, poolSize = 8): Sequelize => {
  const sequelize = makeConnection(() => url, poolSize);
  defineAll(sequelize);
  return sequelize;
};

/** The one pool of the process. */
export const database = (): Sequelize => sharedConnection();

export const closeDatabase = async (): Promise<void> => {
  defineAll(await closeSharedConnection());
};

type FailedStatement = { readonly name?: string; readonly original?: { readonly errno?: number }; readonly parent?: { readonly errno?: number } };

/** ER_LOCK_DEADLOCK, ER_LOCK_WAIT_TIMEOUT, ER_CHECKREAD: another transaction was in the way, and the whole unit can be tried again. */
const inTheWay = new Set([1213, 1205, 1020]);

/** The connector's own numbers for a connection that has gone, and the server's for being shut down (ER_SERVER_SHUTDOWN, ER_CONNECTION_KILLED). */
const connectionGone = new Set([45001, 45004, 45009, 45013, 45019, 45026, 1053, 1927]);

const numberOf = (error: unknown): number => {
  const { original, parent } = error as FailedStatement;
  return original?.errno ?? parent?.errno ?? 0;
};

type Phase = 'begin' | 'work' | 'commit';

/** A commit whose connection went may have been done, so that only a refusal of it is tried again. */
const canTryAgain = (error: unknown, phase: Phase): boolean =>
  inTheWay.has(numberOf(error)) || (phase !== 'commit' && connectionGone.has(numberOf(error)));

const mostTries = 4;

const tryOnce = async <Value>(work: (transaction: Transaction) => Promise<Value>, reach: (phase: Phase) => void): Promise<Value> => {
  reach('begin');
  const transaction = await database().transaction();
  try {
    reach('work');
    const value = await work(transaction);
    reach('commit');
    await transaction.commit();
    return value;
  } catch (error) {
    // The server has rolled back what it lost; what it still holds ends here, and the first error is the one to tell.
    await transaction.rollback().catch(() => undefined);
    throw error;
  }
};

/** Runs a unit of work in one transaction. A deadlock repeats the whole of it, never one statement of a dead transaction. */
export const inTransaction = async <Value>(work: (transaction: Transaction) => Promise<Value>): Promise<Value> => {
  let phase: Phase = 'begin';
  for (let tried = 1; ; tried += 1) {
    try {
      return await tryOnce(work, (reached) => { phase = reached; });
    } catch (error) {
      if (tried === mostTries || !canTryAgain(error, phase)) throw error;
      await new Promise((resolve) => setTimeout(resolve, 20 * tried * tried));
    }
  }
};
