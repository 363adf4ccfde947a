import 'server-only';
import { Sequelize, type Transaction } from 'sequelize';
import { env } from '@/lib/env';
import { defineAll } from '@/models/define-all';

/** Numbers stay numbers, decimals stay exact, and an UPDATE counts the rows it found, not those it altered. */
const connectorOptions = {
  supportBigNumbers: false, bigIntAsNumber: true, checkNumberRange: true, decimalAsNumber: false, insertIdAsNumber: true,
  logParam: false, foundRows: true, connectTimeout: 5_000,
};

export const connect = (url: string, poolSize = 8): Sequelize => {
  const sequelize = new Sequelize(url.replace(/^mysql:/, 'mariadb:'), {
    dialect: 'mariadb', logging: false, timezone: '+00:00', dialectOptions: connectorOptions,
    pool: { max: poolSize, min: 0, idle: 10_000, evict: 1_000, acquire: 8_000 },
  });
  defineAll(sequelize);
  return sequelize;
};

const kept = globalThis as { tamisDatabase?: Sequelize };

/** One pool for the process, also when the framework loads this module twice in development. */
export const database = (): Sequelize => (kept.tamisDatabase ??= connect(env().DATABASE_URL));

export const closeDatabase = async (): Promise<void> => {
  const open = kept.tamisDatabase;
  delete kept.tamisDatabase;
  await open?.close();
};

/** ER_LOCK_DEADLOCK and ER_LOCK_WAIT_TIMEOUT: another transaction was in the way, and the whole unit can be tried again. */
const passing = new Set([1213, 1205]);

const isPassing = (error: unknown): boolean => {
  const { original, parent } = error as { original?: { errno?: number }; parent?: { errno?: number } };
  return passing.has(original?.errno ?? parent?.errno ?? 0);
};

const mostTries = 4;

/** Runs a unit of work in one transaction. A deadlock repeats the whole of it, never one statement of a dead transaction. */
export const inTransaction = async <Value>(work: (transaction: Transaction) => Promise<Value>): Promise<Value> => {
  for (let tried = 1; ; tried += 1) {
    try {
      return await database().transaction(work);
    } catch (error) {
      if (tried === mostTries || !isPassing(error)) throw error;
      await new Promise((resolve) => setTimeout(resolve, 20 * tried * tried));
    }
  }
};
