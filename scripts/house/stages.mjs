import { readFileSync, rmSync } from 'node:fs';
import readline from 'node:readline';
import { root } from './home.mjs';
import { end, identify } from './process-table.mjs';
import { ended, launch } from './run.mjs';
import { say } from './say.mjs';

/** @typedef {{ name: string, passed: number, failed: number }} Outcome */

/**
 * Runs one program with its words passed on line by line, each behind the stage's name, because stages run side by side.
 * @returns {Promise<number | string>} exit code, or the signal that ended it
 */
export async function runStage(name, command, parts, { env = process.env, limitMinutes = 25 } = {}) {
  const child = launch(command, parts, { cwd: root, env: { ...env, FORCE_COLOR: '0', NO_COLOR: '1' }, stdio: ['ignore', 'pipe', 'pipe'] });
  const identity = identify(child.pid);
  const limit = setTimeout(() => {
    say(`${name.padEnd(11)} | not done after ${limitMinutes} minutes, so it is ended here`);
    void end(identity);
  }, limitMinutes * 60_000);
  for (const stream of [child.stdout, child.stderr])
    readline.createInterface({ input: stream }).on('line', (line) => say(`${name.padEnd(11)} | ${line}`));
  try {
    return await ended(child);
  } finally {
    clearTimeout(limit);
  }
}

/** A stage that is one check: well or not. */
export async function runCheck(name, command, parts, options) {
  const code = await runStage(name, command, parts, options);
  return outcome(name, code === 0 ? 1 : 0, code === 0 ? 0 : 1);
}

/** A stage that writes what it counted into a file, read by `count`. */
export async function runCounted(name, command, parts, { report, count, ...options }) {
  rmSync(report, { force: true });
  const code = await runStage(name, command, parts, options);
  return outcome(name, ...Object.values(settle(code, readReport(report, count))));
}

function readReport(report, count) {
  try {
    return count(JSON.parse(readFileSync(report, 'utf8')));
  } catch {
    return { passed: 0, failed: 0 };
  }
}

/** A program that failed without a failed test failed before or between its tests; one that ran none proved nothing. */
export function settle(code, { passed, failed }) {
  if (failed === 0 && (code !== 0 || passed === 0)) return { passed, failed: 1 };
  return { passed, failed };
}

/** Vitest's report: a file that could not be loaded has no tests in it and counts as one that failed. */
export function countVitest({ numPassedTests, numFailedTests, testResults }) {
  const unloaded = testResults.filter(({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0);
  return { passed: numPassedTests, failed: numFailedTests + unloaded.length };
}

/** Playwright's report. A test that passed only when repeated has failed once. */
export const countPlaywright = ({ stats }) => ({ passed: stats.expected, failed: stats.unexpected + stats.flaky });

export function outcome(name, passed, failed) {
  say(`${name.padEnd(11)} | done: ${passed} passed, ${failed} failed`);
  return { name, passed, failed };
}

/** One after the other; what cannot run says so as a failure, the rest goes on. */
export async function inTurn(stages) {
  const outcomes = [];
  for (const [name, run] of stages) outcomes.push(await orFailed(name, run));
  return outcomes;
}

async function orFailed(name, run) {
  try {
    return await run();
  } catch (error) {
    say(`${name.padEnd(11)} | ${error.message}`);
    return outcome(name, 0, 1);
  }
}

export function sum(outcomes) {
  return outcomes.reduce((all, { passed, failed }) => ({ passed: all.passed + passed, failed: all.failed + failed }), { passed: 0, failed: 0 });
}
