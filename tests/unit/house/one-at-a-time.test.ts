import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { describe, expect, onTestFinished, test } from 'vitest';
import { openHome } from '@/scripts/house/home.mjs';
import { keep, readKept } from '@/scripts/house/keep-json.mjs';
import { takeHome } from '@/scripts/house/one-at-a-time.mjs';
import { birthOf, end, identify, isAlive } from '@/scripts/house/process-table.mjs';
import { scratchHome } from './scratch-home';

async function sleeper() {
  const child = spawn('sleep', ['600'], { detached: true, stdio: 'ignore' });
  await once(child, 'spawn');
  const identity = identify(child.pid);
  onTestFinished(() => end(identity));
  return identity;
}

function openedHome() {
  const home = scratchHome();
  openHome(home);
  return home;
}

describe('a data folder serves one start at a time', () => {
  test('a second start is told which process runs and where, and touches nothing', async () => {
    const home = openedHome();
    const first = { ...(await sleeper()), task: 'Tamis', address: 'http://127.0.0.1:3000', children: [] };
    keep(home.running, first);
    await expect(takeHome(home, { task: 'Tamis' })).rejects.toThrow(`Tamis is already running at http://127.0.0.1:3000 (process ${first.pid})`);
    expect(readKept(home.running)).toEqual(first);
    expect(isAlive(first)).toBe(true);
  });

  test('what a killed start left behind is ended', async () => {
    const home = openedHome();
    const orphan = await sleeper();
    keep(home.running, { pid: 999_999, birth: '1', task: 'Tamis', children: [{ name: 'database', ...orphan }] });
    const watch = await takeHome(home, { task: 'Tamis' });
    expect(isAlive(orphan)).toBe(false);
    watch.release();
    expect(readKept(home.running)).toBeUndefined();
  });

  test('another program that was given the same number is left alone', async () => {
    const home = openedHome();
    const stranger = await sleeper();
    keep(home.running, { pid: 999_999, birth: '1', task: 'Tamis', children: [{ name: 'database', pid: stranger.pid, birth: '1' }] });
    const watch = await takeHome(home, { task: 'Tamis' });
    expect(isAlive(stranger)).toBe(true);
    watch.release();
  });

  test('a start whose number now belongs to another program is over', async () => {
    const home = openedHome();
    const stranger = await sleeper();
    keep(home.running, { pid: stranger.pid, birth: '1', task: 'Tamis', children: [] });
    const watch = await takeHome(home, { task: 'Tamis' });
    expect(readKept(home.running)).toMatchObject({ pid: process.pid, birth: birthOf(process.pid) });
    watch.release();
  });
});
