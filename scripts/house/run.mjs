import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { root } from './home.mjs';
import { Sentence } from './sentence.mjs';

/** What this process started and has not seen the end of; stopped when this process stops. */
const running = new Set();

/** Leads a group of its own, so that Ctrl-C reaches only this process and the order of stopping is ours. */
export function launch(command, parts, { env = process.env, stdio = 'inherit', cwd = root } = {}) {
  const child = spawn(command, parts, { cwd, env, stdio, detached: true });
  running.add(child);
  child.once('exit', () => running.delete(child));
  child.once('error', () => running.delete(child));
  return child;
}

export const launched = () => [...running];

/** The exit code, or the signal's name. */
export const ended = (child) =>
  new Promise((resolve, reject) => {
    if (child.exitCode !== null || child.signalCode !== null) resolve(child.exitCode ?? child.signalCode);
    child.once('error', reject);
    child.once('exit', (code, signal) => resolve(code ?? signal));
  });

/**
 * Runs a program to its end with its words in a log, and repeats the last of them when it fails.
 * @param {string} what "npm ci", for the sentence
 */
export async function runQuietly(what, command, parts, log, options = {}) {
  mkdirSync(path.dirname(log), { recursive: true, mode: 0o700 });
  const output = openSync(log, 'w', 0o600);
  let code;
  try {
    code = await ended(launch(command, parts, { ...options, stdio: ['ignore', output, output] }));
  } finally {
    closeSync(output);
  }
  if (code !== 0) throw new Sentence(`${what} failed (${code}), so Tamis stopped here. Its last words, all of them in ${log}:\n${lastLines(log)}`);
}

/** The end of a log, led by the first line that names an error when the end does not hold it. */
export function lastLines(file, count = 15) {
  const lines = readFileSync(file, 'utf8').trimEnd().split('\n');
  const end = lines.slice(-count);
  const cause = lines.slice(0, -count).find((line) => /\b\w*error\b.*:|\bERR!/i.test(line));
  return [...(cause === undefined ? [] : [cause, '...']), ...end].map((line) => `    ${line}`).join('\n');
}

export const inPackages = (...parts) => path.join(root, 'node_modules', ...parts);
