import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, test } from 'vitest';
import { firstWords, judgeDataFolder, whyItEnded } from '@/scripts/house/database.mjs';
import { scratchFolder } from './scratch-home';

describe('the data folder', () => {
  test.each([
    ['none', undefined, 'absent'],
    ['an empty one', [], 'absent'],
    ['one with all its parts', ['aria_log_control', 'ibdata1', 'mysql', 'tamis'], 'whole'],
    ['one without its system tables', ['ibdata1', 'aria_log_control'], 'half-made'],
    ['one that holds something else', ['letters.txt'], 'half-made'],
  ])('%s is %s', (_, entries, state) => {
    expect(judgeDataFolder(entries)).toBe(state);
  });
});

test('the account works from this machine alone and on databases of Tamis alone', () => {
  const words = firstWords('word');
  expect(words).not.toContain("'%'");
  expect(words.match(/GRANT .*/g)).toEqual(["GRANT ALL ON `tamis%`.* TO 'tamis'@'localhost';", "GRANT ALL ON `tamis%`.* TO 'tamis'@'127.0.0.1';"]);
});

describe('a server that ends at once', () => {
  test.each([
    ['[ERROR] mysqld: Disk is full writing (Errcode: 28 "No space left on device")', /The disk is full/],
    ['[ERROR] InnoDB: Unable to lock ./ibdata1 error: 11', /Another database server is using the data folder/],
    ["[ERROR] Can't open file (Errcode: 13 \"Permission denied\")", /may not read its own folder/],
    ['[ERROR] Something new', /Its last words:\n {4}\[ERROR\] Something new/],
  ])('%s', (line, sentence) => {
    const log = path.join(scratchFolder(), 'database.log');
    writeFileSync(log, `${line}\n`);
    expect(whyItEnded(log)).toMatch(sentence);
  });
});
