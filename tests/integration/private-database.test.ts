import { existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import mariadb from 'mariadb';
import { describe, expect, onTestFinished, test } from 'vitest';
import { makeDatabase, startDatabase } from '@/scripts/house/database.mjs';
import { homeAt, openHome } from '@/scripts/house/home.mjs';

function openedHome(depth = '') {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tamis-private-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  const home = homeAt(path.join(folder, depth, '.data'));
  openHome(home);
  return home;
}

async function started(home: ReturnType<typeof openedHome>, password = 'word') {
  const server = await startDatabase(home, password, { isScratch: true });
  onTestFinished(server.stop);
  return server;
}

async function ask(url: string, query: string): Promise<readonly Record<string, unknown>[]> {
  const connection = await mariadb.createConnection(url);
  try {
    return await connection.query(query);
  } finally {
    await connection.end();
  }
}

describe('the private database', () => {
  test('keeps what was written from one start to the next, on the same port, and stops when told', async () => {
    const home = openedHome();
    await makeDatabase(home);
    const first = await started(home);
    await ask(first.url, "CREATE TABLE kept AS SELECT 'bread' AS word");
    await first.stop();
    expect(existsSync(home.databasePid)).toBe(false);

    const second = await started(home);
    expect(second.url).toBe(first.url);
    expect(await ask(second.url, 'SELECT word FROM kept')).toEqual([{ word: 'bread' }]);
  });

  test('lets nobody in without the password, the root account included', async () => {
    const home = openedHome();
    await makeDatabase(home);
    const { url } = await started(home);
    const { port } = new URL(url);
    for (const account of ['tamis', 'tamis:guess', 'root', 'anybody'])
      await expect(mariadb.createConnection(`mariadb://${account}@127.0.0.1:${port}/tamis`)).rejects.toThrow();
  });

  test('starts below a folder too deep for a socket path', async () => {
    const home = openedHome('a-folder-with-a-long-name/'.repeat(5));
    expect(Buffer.byteLength(home.databaseSocket)).toBeGreaterThan(108);
    await makeDatabase(home);
    const { url } = await started(home);
    expect(await ask(url, 'SELECT 1 AS one')).toEqual([{ one: 1 }]);
  });

  test('leaves a half-made folder as it found it', async () => {
    const home = openedHome();
    mkdirSync(home.database);
    writeFileSync(path.join(home.database, 'ibdata1'), '');
    await expect(makeDatabase(home)).rejects.toThrow(/is half-made or damaged, so Tamis left it alone/);
    expect(readdirSync(home.database)).toEqual(['ibdata1']);
  });

  test('a folder whose making was cut off is made anew', async () => {
    const home = openedHome();
    mkdirSync(`${home.database}.making`);
    writeFileSync(path.join(`${home.database}.making`, 'ibdata1'), '');
    expect(await makeDatabase(home)).toBe('made');
    expect(await makeDatabase(home)).toBe('there');
  });
});
