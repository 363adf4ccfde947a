import { createServer } from 'node:net';
import { describe, expect, onTestFinished, test } from 'vitest';
import { openHome } from '@/scripts/house/home.mjs';
import { keep, readKept } from '@/scripts/house/keep-json.mjs';
import { freePort, mustBeFree, readPort, rememberedPort } from '@/scripts/house/ports.mjs';
import { scratchHome } from './scratch-home';

async function occupy(port: number): Promise<void> {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
  onTestFinished(() => new Promise<void>((resolve) => server.close(() => resolve())));
}

describe('the port that people type', () => {
  test.each([
    [undefined, 3000],
    ['', 3000],
    ['3100', 3100],
    ['65535', 65_535],
  ])('PORT=%s means %i', (text, port) => {
    expect(readPort(text, 3000)).toBe(port);
  });

  test.each(['0', '65536', '-1', '3000.5', 'abc', '1e3', ' 80'])('PORT=%s is refused in a sentence', (text) => {
    expect(() => readPort(text, 3000)).toThrow(/which is no port/);
  });

  test('one in use is said, with another to try, and never swapped silently', async () => {
    const port = await freePort();
    await occupy(port);
    await expect(mustBeFree(port, '127.0.0.1')).rejects.toThrow(`Port ${port} is in use by another program`);
  });
});

describe('the ports of private services', () => {
  test('are the same at the next start', async () => {
    const home = scratchHome();
    openHome(home);
    const first = await rememberedPort(home, 'database');
    expect(await rememberedPort(home, 'database')).toBe(first);
  });

  test('give way when somebody else took one, and leave the others as they were', async () => {
    const home = scratchHome();
    openHome(home);
    const taken = await freePort();
    await occupy(taken);
    keep(home.ports, { database: taken, mail: 2525 });
    const port = await rememberedPort(home, 'database');
    expect(port).not.toBe(taken);
    expect(readKept(home.ports)).toEqual({ database: port, mail: 2525 });
  });
});
