import mariadb from 'mariadb';
import { QueryTypes, type Sequelize } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { env } from '@/lib/env';
import { migrate, migrateDown } from '@/lib/server/migrate';
import { makeConnection } from '@/models/shared-connection';

const url = new URL(env().DATABASE_URL);
const name = `${url.pathname.slice(1)}_shape`;
let connection: Sequelize;

const onServer = async (statement: string): Promise<void> => {
  const server = await mariadb.createConnection(url.href);
  await server.query(statement);
  await server.end();
};

beforeAll(async () => {
  await onServer(`DROP DATABASE IF EXISTS \`${name}\``);
  await onServer(`CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  const own = new URL(url.href);
  own.pathname = `/${name}`;
  connection = makeConnection(() => own.href, 1);
});

afterAll(async () => {
  await connection.close();
  await onServer(`DROP DATABASE \`${name}\``);
});

/** Every table as the database itself would make it again. */
const shape = async (): Promise<ReadonlyMap<string, string>> => {
  const tables = await connection.query<{ name: string }>(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_name <> 'migrations_done' ORDER BY table_name", { type: QueryTypes.SELECT },
  );
  const shapes = new Map<string, string>();
  for (const table of tables) {
    const [row] = await connection.query<Record<'Create Table', string>>(`SHOW CREATE TABLE \`${table.name}\``, { type: QueryTypes.SELECT });
    shapes.set(table.name, row?.['Create Table'] ?? '');
  }
  return shapes;
};

describe('migrations', () => {
  it('make the same tables again after they were taken back, and leave none behind in between', async () => {
    const done = await migrate(connection);
    const first = await shape();
    expect(done.length).toBeGreaterThan(0);
    expect(first.size).toBeGreaterThan(30);

    expect(await migrateDown(connection)).toEqual([...done].reverse());
    expect([...(await shape()).keys()]).toEqual([]);

    expect(await migrate(connection)).toEqual(done);
    expect(await shape()).toEqual(first);
  });

  it('do nothing when they are run again', async () => {
    await migrate(connection);
    expect(await migrate(connection)).toEqual([]);
  });

  it('finish what a cut-off run began', async () => {
    await migrate(connection);
    const whole = await shape();
    await connection.query('ALTER TABLE sites DROP FOREIGN KEY sites_live_plan');
    await connection.query('DROP TABLE changes, divert_stations, diverts');
    await connection.query('DELETE FROM migrations_done');
    await migrate(connection);
    const keysOf = (shapes: ReadonlyMap<string, string>) => [...shapes].map(([table, statement]) => [table, statement.split(',\n').map((line) => line.trim()).sort()]);
    expect(keysOf(await shape())).toEqual(keysOf(whole));
  });

  it('give every table a primary key, as a cluster of databases needs', async () => {
    await migrate(connection);
    const without = [...(await shape())].filter(([, statement]) => !statement.includes('PRIMARY KEY')).map(([table]) => table);
    expect(without).toEqual([]);
  });
});
