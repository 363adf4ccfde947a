import { spawnSync } from 'node:child_process';

/** Runs a Python program on JSON and reads its JSON; the message says what to install when Python is not there. */
export const askPython = <Answer>(program: string, input: unknown): Answer => {
  const run = spawnSync('python3', ['-c', program], { input: JSON.stringify(input), encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
  if (run.error !== undefined) throw new Error(`python3 did not start (${run.error.message}). It is the second opinion on addresses: npm test installs it, or apt-get install python3.`);
  if (run.status !== 0) throw new Error(`python3 ended with ${run.status}: ${run.stderr}`);
  return JSON.parse(run.stdout) as Answer;
};
