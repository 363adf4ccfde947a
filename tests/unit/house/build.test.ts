import { mkdirSync, renameSync, utimesSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, test } from 'vitest';
import { sourceFiles, sourceFingerprint } from '@/scripts/house/build.mjs';
import { packagesFingerprint } from '@/scripts/house/packages.mjs';
import { scratchFolder } from './scratch-home';

function project(files: Readonly<Record<string, string>>): string {
  const folder = scratchFolder();
  for (const [name, text] of Object.entries(files)) write(folder, name, text);
  return folder;
}

function write(folder: string, name: string, text: string): void {
  mkdirSync(path.dirname(path.join(folder, name)), { recursive: true });
  writeFileSync(path.join(folder, name), text);
}

const small = { 'app/page.tsx': 'page', 'lib/names/check.ts': 'check', 'package-lock.json': '{}' };

describe('the build is made again', () => {
  test.each([
    ['when a source file changes', 'app/page.tsx', 'other'],
    ['when one is added in a new folder', 'widgets/new.ts', 'new'],
    ['when the lock changes', 'package-lock.json', '{"changed":true}'],
  ])('%s', (_, name, text) => {
    const folder = project(small);
    const before = sourceFingerprint(folder);
    write(folder, name, text);
    expect(sourceFingerprint(folder)).not.toBe(before);
  });

  test('when a file is renamed', () => {
    const folder = project(small);
    const before = sourceFingerprint(folder);
    renameSync(path.join(folder, 'lib/names/check.ts'), path.join(folder, 'lib/names/judge.ts'));
    expect(sourceFingerprint(folder)).not.toBe(before);
  });
});

describe('the build is kept', () => {
  test.each([
    ['when a test changes', 'lib/names/check.test.ts'],
    ['when a script changes', 'scripts/start.mjs'],
    ['when data changes', '.data/secrets.json'],
    ['when a built file changes', '.next/BUILD_ID'],
    ['when a document changes', 'README.md'],
  ])('%s', (_, name) => {
    const folder = project(small);
    const before = sourceFingerprint(folder);
    write(folder, name, 'changed');
    expect(sourceFingerprint(folder)).toBe(before);
  });

  test('when a file is only touched', () => {
    const folder = project(small);
    const before = sourceFingerprint(folder);
    utimesSync(path.join(folder, 'app/page.tsx'), 1, 1);
    expect(sourceFingerprint(folder)).toBe(before);
  });

  test('whatever order the disk lists the files in', () => {
    expect(sourceFiles(project(small))).toEqual(['app/page.tsx', 'lib/names/check.ts', 'package-lock.json']);
  });
});

test('packages are installed again after a change of the lock or of the Node.js line, not of its patch', () => {
  const known = packagesFingerprint('lock', '20.20.2');
  expect(packagesFingerprint('lock', '20.9.0')).toBe(known);
  expect(packagesFingerprint('lock', '22.1.0')).not.toBe(known);
  expect(packagesFingerprint('other lock', '20.20.2')).not.toBe(known);
});
