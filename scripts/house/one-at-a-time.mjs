import { closeSync, openSync, rmSync, writeSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { keep, readKept } from './keep-json.mjs';
import { end, identify, isAlive } from './process-table.mjs';
import { Sentence } from './sentence.mjs';

const settleMs = 50;

/**
 * Takes the data folder for this process. What an earlier start left running when it was killed is ended first: it is known by
 * number and birth, so nothing else can be meant.
 * @param {{ running: string, folder: string }} home
 * @param {{ task: string, address?: string, isDevelopment?: boolean }} about what this process is, in words for the second one that comes
 */
export async function takeHome(home, about) {
  const earlier = readRunning(home);
  if (earlier && isAlive(earlier))
    throw new Sentence(
      `${earlier.task} is already running${earlier.address ? ` at ${earlier.address}` : ''} (process ${earlier.pid}); use that one, or stop it with Ctrl-C where it runs. Nothing was changed.`,
    );
  for (const child of earlier?.children ?? []) await end(child);
  rmSync(home.running, { force: true });
  claim(home.running, about);

  const record = { ...identify(process.pid), ...about, children: [] };
  keep(home.running, record);
  await pause(settleMs);
  if (readRunning(home)?.pid !== process.pid) throw sameMoment();
  return {
    add(name, pid) {
      record.children.push({ name, ...identify(pid) });
      keep(home.running, record);
    },
    release: () => rmSync(home.running, { force: true }),
  };
}

export function readRunning(home) {
  try {
    return readKept(home.running);
  } catch (error) {
    if (!(error instanceof Sentence)) throw error;
    return undefined; // half written by a process that was cut off: it took nothing yet
  }
}

/** Two starts in the same instant: the file system lets one of them make the file, and whoever reads another's name in it gives way. */
function claim(file, about) {
  try {
    const handle = openSync(file, 'wx', 0o600);
    writeSync(handle, JSON.stringify({ ...identify(process.pid), ...about, children: [] }));
    closeSync(handle);
  } catch (error) {
    throw error.code === 'EEXIST' ? sameMoment() : error;
  }
}

const sameMoment = () => new Sentence('Another start of Tamis began in the same moment, so this one gave way; use that one. Nothing was changed.');
