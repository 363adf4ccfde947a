import { randomBytes } from 'node:crypto';
import mariadb from 'mariadb';
import { migrate } from '@/lib/server/migrate';
import { makeConnection } from '@/models/shared-connection';

/** Tests empty every table, so they work only in a database whose name says that it is for them. */
const forTests = /(_integration|_test)$/;

const databaseForTests = (): URL => {
  const given = process.env.DATABASE_URL;
  if (!given) throw new Error('DATABASE_URL is not set, so the integration tests have no database. Run "npm test integration", which starts one, or set it to an empty MariaDB database whose name ends in _integration.');
  const url = new URL(given);
  const name = url.pathname.slice(1);
  if (!forTests.test(name)) throw new Error(`The integration tests empty their database, and ${name} does not say that it may be emptied. Name one that ends in _integration.`);
  return url;
};

const makeDatabase = async (url: URL): Promise<void> => {
  const server = await mariadb.createConnection({ host: url.hostname, port: Number(url.port || 3306), user: decodeURIComponent(url.username), password: decodeURIComponent(url.password) });
  await server.query(`CREATE DATABASE IF NOT EXISTS \`${url.pathname.slice(1)}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  await server.end();
};

/** Before all integration tests: the database of DATABASE_URL in the newest shape. */
export default async function prepareDatabase(): Promise<void> {
  const url = databaseForTests();
  process.env.NEXTAUTH_SECRET ??= randomBytes(32).toString('base64url');
  process.env.NEXTAUTH_URL ??= 'http://127.0.0.1:3000';
  await makeDatabase(url);
  const connection = makeConnection(() => url.href, 1);
  await migrate(connection);
  await connection.close();
}
