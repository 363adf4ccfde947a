import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { root } from './home.mjs';
import { inPackages, runQuietly } from './run.mjs';

/** What a build never reads; all else counts, so that a new folder cannot be forgotten. */
const outside = new Set(['node_modules', 'tests', 'scripts', 'migrations', 'seeders', 'test-results', 'playwright-report', 'next-env.d.ts', 'vitest.config.ts', 'playwright.config.ts', 'eslint.config.mjs']);

const isSource = (relative) => {
  const [top = ''] = relative.split(path.sep);
  return !top.startsWith('.') && !outside.has(top) && !/\.(test\.tsx?|md|tsbuildinfo|log)$/.test(relative);
};

/** Every file that a build may read, sorted, relative to the folder. */
export function sourceFiles(folder, within = '') {
  return readdirSync(path.join(folder, within), { withFileTypes: true })
    .map((entry) => ({ entry, relative: path.join(within, entry.name) }))
    .filter(({ relative }) => isSource(relative))
    .flatMap(({ entry, relative }) => (entry.isDirectory() ? sourceFiles(folder, relative) : [relative]))
    .sort();
}

/** By content, not by time: a fresh clone and a restored backup both have new times on old files. */
export function sourceFingerprint(folder) {
  const hash = createHash('sha256').update(process.versions.node);
  for (const file of sourceFiles(folder)) hash.update(`\0${file}\0`).update(readFileSync(path.join(folder, file)));
  return hash.digest('hex');
}

const mark = path.join(root, '.next', 'tamis-source');

export function isBuilt() {
  return existsSync(path.join(root, '.next', 'BUILD_ID')) && existsSync(mark) && readFileSync(mark, 'utf8') === sourceFingerprint(root);
}

/** The mark is taken away first and written last: a build that was cut off is made again. */
export async function build(home, env) {
  if (isBuilt()) return 'up to date';
  const fingerprint = sourceFingerprint(root);
  rmSync(mark, { force: true });
  await runQuietly('The build', process.execPath, [inPackages('next', 'dist', 'bin', 'next'), 'build'], home.log('build'), {
    env: { ...env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
  });
  writeFileSync(mark, fingerprint);
  return 'built';
}
