import mariadb, { type Connection } from 'mariadb';
import { told } from './product';

const copy = 'tamis_as_seeded';
const quote = (name: string) => `\`${name}\``;

async function inDatabase<T>(work: (connection: Connection, name: string) => Promise<T>): Promise<T> {
  const url = told('DATABASE_URL');
  const connection = await mariadb.createConnection(url);
  try {
    await connection.query('SET foreign_key_checks = 0');
    return await work(connection, new URL(url).pathname.slice(1));
  } finally {
    await connection.end();
  }
}

/** Names of tables, each with the columns that can be written. */
async function tablesOf(connection: Connection, database: string): Promise<ReadonlyMap<string, string>> {
  const rows: readonly { name: string; columns: string }[] = await connection.query(
    `SELECT table_name AS name, GROUP_CONCAT(CONCAT('\`', column_name, '\`') ORDER BY ordinal_position) AS columns
       FROM information_schema.columns JOIN information_schema.tables USING (table_schema, table_name)
      WHERE table_schema = ? AND table_type = 'BASE TABLE' AND is_generated = 'NEVER' GROUP BY table_name`,
    [database],
  );
  return new Map(rows.map(({ name, columns }) => [name, columns]));
}

/** Puts the demo aside as it was seeded. */
export const keepDemo = (): Promise<void> =>
  inDatabase(async (connection, name) => {
    await connection.query(`DROP DATABASE IF EXISTS ${quote(copy)}`);
    await connection.query(`CREATE DATABASE ${quote(copy)} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
    for (const table of (await tablesOf(connection, name)).keys())
      await connection.query(`CREATE TABLE ${quote(copy)}.${quote(table)} AS SELECT * FROM ${quote(name)}.${quote(table)}`);
  });

/** In one transaction, so that a page that is still open never sees half a demo. */
export const restoreDemo = (): Promise<void> =>
  inDatabase(async (connection, name) => {
    await connection.beginTransaction();
    for (const [table, columns] of await tablesOf(connection, name)) {
      await connection.query(`DELETE FROM ${quote(name)}.${quote(table)}`);
      await connection.query(`INSERT INTO ${quote(name)}.${quote(table)} (${columns}) SELECT ${columns} FROM ${quote(copy)}.${quote(table)}`);
    }
    await connection.commit();
  });
