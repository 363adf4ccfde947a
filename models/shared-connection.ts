import { Sequelize } from 'sequelize';
import { env } from '@/lib/env';

/** Numbers stay numbers, decimals stay exact, and an UPDATE counts the rows it found, not those it altered. */
const connectorOptions = {
  supportBigNumbers: false, bigIntAsNumber: true, checkNumberRange: true, decimalAsNumber: false, insertIdAsNumber: true,
  logParam: false, foundRows: true, connectTimeout: 5_000,
};

/** A pool whose address is asked for when it first connects, so that a build can load every module without a database. */
export const makeConnection = (address: () => string, poolSize = 8): Sequelize =>
  new Sequelize({
    dialect: 'mariadb', logging: false, timezone: '+00:00', dialectOptions: connectorOptions,
    pool: { max: poolSize, min: 0, idle: 10_000, evict: 1_000, acquire: 8_000 },
    hooks: {
      beforeConnect: (config) => {
        const url = new URL(address());
        Object.assign(config, {
          host: url.hostname, port: Number(url.port === '' ? 3306 : url.port), username: decodeURIComponent(url.username),
          password: decodeURIComponent(url.password), database: decodeURIComponent(url.pathname.slice(1)),
        });
      },
    },
  });

const kept = globalThis as { tamisConnection?: Sequelize };

/** One pool for the process. Each model ties itself to it when it is loaded, however often the framework loads it. */
export const sharedConnection = (): Sequelize => (kept.tamisConnection ??= makeConnection(() => env().DATABASE_URL));

/** Closes the pool and leaves a fresh one in its place. */
export const closeSharedConnection = async (): Promise<Sequelize> => {
  const open = kept.tamisConnection;
  kept.tamisConnection = makeConnection(() => env().DATABASE_URL);
  await open?.close();
  return kept.tamisConnection;
};
