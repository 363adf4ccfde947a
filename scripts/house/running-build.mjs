import path from 'node:path';
import { isBuilt } from './build.mjs';
import { homeAt, root } from './home.mjs';
import { readRunning } from './one-at-a-time.mjs';
import { isAlive } from './process-table.mjs';
import { Sentence } from './sentence.mjs';

/** A build replaces the files that a started Tamis serves; development keeps its own beside them. */
export function mustNotBuildUnderARunningTamis() {
  const running = readRunning(homeAt(path.join(root, '.data')));
  if (!running || !isAlive(running) || running.isDevelopment || isBuilt()) return;
  throw new Sentence(
    `Tamis is running from this folder (process ${running.pid}) and its source has changed since it was built, so a new build would break it; stop it with Ctrl-C where it runs, then start this again.`,
  );
}
