import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { expect, test } from 'vitest';
import { lastLines, runQuietly } from '@/scripts/house/run.mjs';
import { scratchFolder } from './scratch-home';

test('a program that fails is quoted: the error that it named first, then its end', () => {
  const log = path.join(scratchFolder(), 'some.log');
  writeFileSync(log, ['Starting', 'MigrationError: no such table', ...Array.from({ length: 20 }, (_, index) => `line ${index}`)].join('\n'));
  expect(lastLines(log, 2)).toBe('    MigrationError: no such table\n    ...\n    line 18\n    line 19');
});

test('a program that fails is said in one sentence with the place of its log', async () => {
  const log = path.join(scratchFolder(), 'some.log');
  await expect(runQuietly('The build', process.execPath, ['-e', 'console.log("no room"); process.exit(3)'], log)).rejects.toThrow(
    `The build failed (3), so Tamis stopped here. Its last words, all of them in ${log}:\n    no room`,
  );
});

test('a program that is not there fails the step', async () => {
  await expect(runQuietly('npm ci', '/nowhere/npm', ['ci'], path.join(scratchFolder(), 'some.log'))).rejects.toThrow(/ENOENT/);
});
