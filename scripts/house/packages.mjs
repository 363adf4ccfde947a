import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { root } from './home.mjs';
import { inPackages, runQuietly } from './run.mjs';

const mark = inPackages('.tamis-lock');

/** What node_modules must have been made from: the lock, and the Node.js line that native parts were chosen for. */
export function packagesFingerprint(lockText, nodeVersion = process.versions.node) {
  const major = nodeVersion.split('.')[0];
  return createHash('sha256').update(`${major} ${process.platform} ${process.arch}\n${lockText}`).digest('hex');
}

/** Runs npm ci when node_modules is missing, stale or cut off half way: the mark is written last. */
export async function installPackages(home) {
  const wanted = packagesFingerprint(readFileSync(path.join(root, 'package-lock.json'), 'utf8'));
  if (existsSync(mark) && readFileSync(mark, 'utf8') === wanted) return 'there';
  await runQuietly('npm ci', 'npm', ['ci', '--include=dev', '--no-fund', '--no-audit'], home.log('npm-ci'));
  writeFileSync(mark, wanted);
  return 'installed';
}
