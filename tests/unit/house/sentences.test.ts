import { describe, expect, test } from 'vitest';
import { mustHaveRoom } from '@/scripts/house/home.mjs';
import { Sentence, sentenceOf } from '@/scripts/house/sentence.mjs';

const fault = (code: string) => Object.assign(new Error(code), { code, path: '/srv/tamis/.data' });

describe('a stop that was foreseen is one sentence', () => {
  test.each([
    ['EACCES', /may not write \/srv\/tamis\/\.data/],
    ['EROFS', /can only be read/],
    ['ENOSPC', /is full/],
    ['EDQUOT', /Your share of the disk/],
  ])('%s', (code, words) => {
    expect(sentenceOf(fault(code), '/elsewhere')).toMatch(words);
  });

  test('words made on purpose are passed on', () => {
    expect(sentenceOf(new Sentence('Port 80 is in use.'), '/')).toBe('Port 80 is in use.');
  });

  test('a fault that nobody foresaw keeps its stack', () => {
    expect(sentenceOf(new TypeError('x is not a function'), '/')).toBeUndefined();
  });
});

describe('room on the disk', () => {
  const disk = (freeBytes: number) => () => ({ bavail: freeBytes / 4096, bsize: 4096 });

  test('too little is said with both figures before anything is written', () => {
    expect(() => mustHaveRoom('/srv/.data', 200_000_000, disk(40_960_000) as never)).toThrow(/has 40 MB free and Tamis wants 200 MB/);
  });

  test('enough is not mentioned', () => {
    expect(() => mustHaveRoom('/srv/.data', 200_000_000, disk(409_600_000) as never)).not.toThrow();
  });
});
