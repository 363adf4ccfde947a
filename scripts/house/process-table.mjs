import { readFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';

/**
 * When a process started, in clock ticks since boot, or undefined when there is none (a zombie counts as none).
 * With its number it names a process for good, even after the number is given out again (proc(5), field 22).
 */
export function birthOf(pid) {
  try {
    const text = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = text.slice(text.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? undefined : fields[19];
  } catch {
    return undefined;
  }
}

export const identify = (pid) => ({ pid, birth: birthOf(pid) });

export const isAlive = ({ pid, birth }) => birth !== undefined && birthOf(pid) === birth;

/** Asks a process to end, and its group when it leads one; insists after the time given. Never touches one that is not the one named. */
export async function end(identity, patienceMs = 10_000) {
  for (const signal of ['SIGTERM', 'SIGKILL']) {
    if (!isAlive(identity)) return;
    tell(identity.pid, signal);
    const until = Date.now() + patienceMs;
    while (isAlive(identity) && Date.now() < until) await pause(25);
  }
}

function tell(pid, signal) {
  for (const target of [-pid, pid]) {
    try {
      process.kill(target, signal);
      return;
    } catch (error) {
      if (error.code !== 'ESRCH') throw error;
    }
  }
}
