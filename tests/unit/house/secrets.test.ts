import { statSync, writeFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { openHome } from '@/scripts/house/home.mjs';
import { openSecrets } from '@/scripts/house/secrets.mjs';
import { scratchHome } from './scratch-home';

function openedHome() {
  const home = scratchHome();
  openHome(home);
  return home;
}

describe('the secrets', () => {
  test('are made once, differ from one house to the next, and are long enough', () => {
    const home = openedHome();
    const secrets = openSecrets(home);
    expect(openSecrets(home)).toEqual(secrets);
    expect(openSecrets(openedHome())).not.toEqual(secrets);
    expect(secrets.sessionSecret.length).toBeGreaterThanOrEqual(64);
    expect(secrets.demoPassword).toMatch(/^[a-z]{6}-[a-z]{6}-[a-z]{6}-\d\d$/);
  });

  test('can be read by their owner alone', () => {
    const home = openedHome();
    openSecrets(home);
    expect(statSync(home.secrets).mode & 0o777).toBe(0o600);
    expect(statSync(home.folder).mode & 0o777).toBe(0o700);
  });

  test('an older file keeps what it has and gains what is new', () => {
    const home = openedHome();
    writeFileSync(home.secrets, JSON.stringify({ databasePassword: 'kept-as-it-was' }));
    const secrets = openSecrets(home);
    expect(secrets.databasePassword).toBe('kept-as-it-was');
    expect(openSecrets(home)).toEqual(secrets);
  });

  test.each(['{"sessionSecret":', '{"sessionSecret": ""}', '{"sessionSecret": 7}'])('a damaged file (%s) is said and never written over', (text) => {
    const home = openedHome();
    writeFileSync(home.secrets, text);
    expect(() => openSecrets(home)).toThrow(home.secrets);
    expect(statSync(home.secrets).size).toBe(text.length);
  });
});
