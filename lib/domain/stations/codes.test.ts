import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seeded } from '@/tests/fixtures/generated-site';
import { codeClash, isCode, suggestCode } from './codes';

const taken = (...codes: readonly string[]) => codes.map((code) => ({ name: `station ${code}`, code }));

describe('station codes', () => {
  it.each([
    ['PA', taken('PY'), { name: 'station PY', letter: 1 }],
    ['BR', taken('GR'), { name: 'station GR', letter: 2 }],
    ['BA', taken('GR', 'PY'), null],
  ])('tell whether %s could be taken for another', (code, others, clash) => {
    expect(codeClash(code, others)).toEqual(clash);
  });

  it.each([
    ['Grill', [], 'GR'], ['Bar', taken('GR'), 'BA'], ['Pass', taken('GR', 'LD', 'SC', 'PY', 'BA'), 'AS'], ['Crème', [], 'CR'], ['7', taken('AA'), 'BB'],
  ])('are read out of the name %s', (name, others, code) => {
    expect(suggestCode(name, others)).toBe(code);
  });

  it('are always free while a letter is left', () => {
    fc.assert(fc.property(fc.array(fc.string(), { maxLength: 26 }), (names) => {
      const stations: { name: string; code: string }[] = [];
      for (const name of names) {
        const code = suggestCode(name, stations)!;
        expect(isCode(code)).toBe(true);
        expect(codeClash(code, stations)).toBeNull();
        stations.push({ name, code });
      }
      if (stations.length === 26) expect(suggestCode('one more', stations)).toBeNull();
    }), seeded);
  });
});
