import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { NamingPolicy } from '@/lib/domain/site/site';
import { checkPrinterName } from './check-printer-name';
import type { NameContext } from './name-context';
import { foldName } from './name-limits';
import { defaultNamingPolicy } from './naming-policy';
import { suggestName } from './suggest-name';

describe('a better name leaves out first and numbers second', () => {
  it.each([
    ['LARDER 1', [], 'LARDER1'],
    ['Küche 1', [], 'Kuche1'],
    ['Grill/Fry', [], 'GrillFry'],
    ['1GRILL', [], 'GRILL'],
    ['-GRILL-', [], 'GRILL'],
    ['GRILL1', ['grill1'], 'GRILL2'],
    ['GRILL 1', ['GRILL1', 'GRILL2'], 'GRILL3'],
    ['GRILL', ['Grill'], 'GRILL1'],
    ['BARO', ['BAR0'], 'BARO1'],
    ['CON', [], 'CON1'],
    ['COM1', [], 'COM10'],
    ['THELONGESTNAMEEVER', [], 'THELONGESTNA'],
    ['THELONGESTNAMEEVER', ['THELONGESTNA'], 'THELONGESTN1'],
    ['', [], 'P1'],
    ['厨房', [], 'P1'],
    ['G', [], 'G1'],
  ])('%j beside %j becomes %s', (wanted, taken, better) => {
    expect(suggestName(wanted, taken, defaultNamingPolicy)).toBe(better);
  });
});

const policy: fc.Arbitrary<NamingPolicy> = fc.record({
  minLength: fc.integer({ min: 1, max: 31 }), maxLength: fc.integer({ min: 2, max: 31 }),
  allowUnderscore: fc.boolean(), allowHyphen: fc.boolean(), mustStartWithLetter: fc.boolean(),
});
const nearName = fc.oneof(
  fc.string({ unit: 'grapheme', maxLength: 40 }),
  fc.tuple(fc.constantFrom('GRILL', 'LARDER', 'BAR', 'con', 'COM', 'lpt', 'PASS', 'O', 'I'), fc.constantFrom('', ' ', '-', '\u200b', '#'), fc.constantFrom('', '0', '1', 'O', 'l', 'I', '99')).map((parts) => parts.join('')),
);

it('always passes every rule and is always unique', () => {
  fc.assert(fc.property(nearName, fc.array(nearName, { maxLength: 25 }), policy, (wanted, taken, sitePolicy) => {
    const better = suggestName(wanted, taken, sitePolicy);
    const context: NameContext = { id: 'p', policy: sitePolicy, others: taken, rivals: taken, ownStations: [], otherStations: [] };
    expect(checkPrinterName(better, context)).toEqual([]);
    expect(taken.map(foldName)).not.toContain(foldName(better));
  }), { seed: 20261201, numRuns: 1_500 });
});

it('passes for a printer whose name speaks of another station', () => {
  const stations = fc.uniqueArray(fc.constantFrom('Grill', 'Larder', 'Cold larder', 'Bar', 'Pass', 'Sauce'), { minLength: 2 });
  fc.assert(fc.property(stations, nearName, fc.array(nearName, { maxLength: 8 }), ([own = '', ...other], wanted, taken) => {
    const context: NameContext = { id: 'p', policy: defaultNamingPolicy, others: taken, rivals: taken, ownStations: [own], otherStations: other };
    for (const fix of checkPrinterName(wanted, context).flatMap((finding) => finding.fixes)) {
      expect(fix.kind === 'rename-printer' && checkPrinterName(fix.name, context)).toEqual([]);
    }
  }), { seed: 20261201, numRuns: 500 });
});

it('keeps a good name as it is', () => {
  fc.assert(fc.property(nearName, (wanted) => {
    const context: NameContext = { id: 'p', policy: defaultNamingPolicy, others: [], rivals: [], ownStations: [], otherStations: [] };
    fc.pre(checkPrinterName(wanted, context).length === 0 && !/[-_]$/.test(wanted));
    expect(suggestName(wanted, [], defaultNamingPolicy)).toBe(wanted);
  }), { seed: 20261201, numRuns: 500 });
});
