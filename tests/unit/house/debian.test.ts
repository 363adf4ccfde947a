import { describe, expect, test } from 'vitest';
import { debianPrograms, missingPackages, wayToInstall } from '@/scripts/house/debian.mjs';

const both = [debianPrograms.database, debianPrograms.browser];
const finds = (...names: readonly string[]) => (name: string) => (names.includes(name) ? `/usr/bin/${name}` : undefined);

describe('what Debian provides', () => {
  test('nothing is asked of it when every program is there', () => {
    expect(missingPackages(both, finds('mariadbd', 'mariadb-install-db', 'my_print_defaults', 'chromium'))).toEqual([]);
  });

  test('a server without its set-up program counts as missing', () => {
    expect(missingPackages(both, finds('mariadbd', 'my_print_defaults', 'chromium'))).toEqual(debianPrograms.database.packages);
  });

  test('root installs, without asking', () => {
    expect(wayToInstall(['chromium'], { isRoot: true, hasApt: true })).toEqual({
      kind: 'run',
      command: 'apt-get update && apt-get install -y --no-install-recommends chromium',
    });
  });

  test('anybody else is given the one command to run', () => {
    expect(wayToInstall(['chromium'], { isRoot: false, hasApt: true })).toMatchObject({
      kind: 'sentence',
      text: expect.stringContaining('sudo apt-get update && sudo apt-get install -y --no-install-recommends chromium'),
    });
  });

  test('a system without apt-get is told what is wanted', () => {
    expect(wayToInstall(['chromium'], { isRoot: true, hasApt: false })).toMatchObject({ kind: 'sentence', text: expect.stringContaining('no apt-get') });
  });
});
