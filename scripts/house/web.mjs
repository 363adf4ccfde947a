import { closeSync, openSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { end, identify } from './process-table.mjs';
import { inPackages, lastLines, launch } from './run.mjs';
import { Sentence } from './sentence.mjs';

/**
 * In development its words go to the person's terminal; else into a log, of which the last are repeated when it fails.
 * @param {{ home: object, env: object, host: string, port: number, isDevelopment?: boolean, onStart?: (pid: number) => void }} options
 */
export async function startWeb({ home, env, host, port, isDevelopment = false, onStart = () => {} }) {
  const logFile = home.log('web');
  const log = openSync(logFile, 'w', 0o600);
  const output = isDevelopment ? 'inherit' : log;
  const parts = [inPackages('next', 'dist', 'bin', 'next'), isDevelopment ? 'dev' : 'start', '-H', host, '-p', String(port)];
  const child = launch(process.execPath, parts, {
    env: { ...env, NODE_ENV: isDevelopment ? 'development' : 'production', NEXT_TELEMETRY_DISABLED: '1' },
    stdio: ['ignore', output, output],
  });
  closeSync(log);
  onStart(child.pid);
  await untilAnswering(child, `http://${host}:${port}/`, () => (isDevelopment ? 'Its last words are above.' : `Its last words, all of them in ${logFile}:\n${lastLines(logFile)}`));
  const identity = identify(child.pid);
  return { child, stop: () => end(identity) };
}

/** Any answer will do, while the child lives: the port was free a moment ago and is now its own. */
async function untilAnswering(child, address, lastWords) {
  for (let waited = 0; waited < 120_000; waited += 100) {
    if (child.exitCode !== null || child.signalCode !== null) throw new Sentence(`The web server ended as soon as it started. ${lastWords()}`);
    try {
      await fetch(address, { method: 'HEAD', redirect: 'manual', signal: AbortSignal.timeout(60_000) });
      return;
    } catch {
      await pause(100);
    }
  }
  await end(identify(child.pid));
  throw new Sentence(`The web server did not answer within two minutes, so Tamis stopped it. ${lastWords()}`);
}
