import { describe, expect, it } from 'vitest';
import { checkPrinterName } from '@/lib/domain/names/check-printer-name';
import type { NameContext } from '@/lib/domain/names/name-context';
import { foldName } from '@/lib/domain/names/name-limits';
import { defaultNamingPolicy } from '@/lib/domain/names/naming-policy';

const context = (...others: readonly string[]): NameContext => ({ id: 'p', policy: defaultNamingPolicy, others, rivals: others, ownStations: [], otherStations: [] });
const stopsOf = (name: string, ...others: readonly string[]): readonly string[] =>
  checkPrinterName(name, context(...others)).filter((finding) => finding.severity === 'stop').map((finding) => finding.code);
const checksOf = (name: string): readonly string[] =>
  checkPrinterName(name, context()).filter((finding) => finding.severity === 'check').map((finding) => finding.code);

/** lpadmin of CUPS 2.4.2 (Debian 12) refuses these names for a raw queue. */
describe('what CUPS refuses is a stop', () => {
  it.each([
    ['KITCHEN 1', 'name-space'], ['Grill/Fry', 'name-refused'], ['Grill\\Fry', 'name-refused'], ['Grill#1', 'name-refused'],
    ['Grill?1', 'name-refused'], ["Chef's", 'name-refused'], ['Say"hi"', 'name-refused'], ['Grill\t1', 'name-space'],
    ['Grill\u007f1', 'name-invisible'], ['', 'name-empty'], ['A'.repeat(128), 'name-too-long'], ['ü'.repeat(64), 'name-too-long'],
    ['Grill@Line 2', 'name-space'], ['Grill@Line/2', 'name-refused'],
  ])('%j: %s', (name, code) => {
    expect(stopsOf(name)).toEqual([code]);
  });

  it('and re-points the queue of a name that differs only in case, so the second is a stop (lpadmin(8): not case-sensitive)', () => {
    expect(stopsOf('kitchen', 'Kitchen')).toEqual(['name-taken']);
  });
});

/** The same lpadmin takes these, and the reason they are not good names here is another one. */
describe('what CUPS takes', () => {
  it.each([['Kitchen'], ['Grill-1'], ['Grill_1']])('%s is a good name', (name) => {
    expect(checkPrinterName(name, context())).toEqual([]);
  });

  it.each([
    ['Grill.1'], ['Grill@Line'], ['Grill&Co'], ['Grill(1)'], ['Bar$1'], ['Bar`1'], ['Bar~1'], ['Bar!'], ['-Grill'], ['.hidden'], ['..'], ['1'], ['Grill%201'],
  ])('%s is outside the default policy, and no more', (name) => {
    expect([stopsOf(name), checksOf(name)]).toEqual([[], ['name-outside-policy']]);
  });

  it.each([['Küche'], ['厨房'], ['🍕🍕']])('%s is not ASCII', (name) => {
    expect([stopsOf(name), checksOf(name)]).toEqual([[], ['name-not-ascii']]);
  });

  it.each([
    ['Grill,Fry', '[MS-RPRN] 2.2.4.14'], ['Grill+Fry', '[MS-FSCC] 2.1.6'], ['Grill;1', '[MS-FSCC] 2.1.6'], ['Grill|1', '[MS-FSCC] 2.1.6'], ['Bar:1', '[MS-FSCC] 2.1.6'],
    ['Bar=1', '[MS-FSCC] 2.1.6'], ['Bar<1>', '[MS-FSCC] 2.1.6'], ['Bar*', '[MS-FSCC] 2.1.6'], ['Bar[1]', '[MS-FSCC] 2.1.6'],
  ])('%s is refused by Windows (%s)', (name) => {
    expect(stopsOf(name)).toEqual(['name-refused']);
  });

  it('keeps two compositions of é apart, which look alike: here they are one name', () => {
    expect(foldName('e\u0301')).toBe(foldName('\u00e9'));
    expect(stopsOf('Cafe\u0301', 'Caf\u00e9')).toEqual(['name-taken']);
  });

  it.each([
    ['a no-break space', 'Grill\u00a01', 'name-space'], ['a zero-width space', 'Grill\u200b1', 'name-invisible'], ['a soft hyphen', 'Grill\u00ad1', 'name-invisible'],
    ['a word joiner', 'Grill\u20601', 'name-invisible'], ['a byte-order mark', '\ufeffGrill1', 'name-space'], ['a right-to-left mark', 'Grill\u200f1', 'name-invisible'],
    ['a blank Hangul letter', 'Grill\u31641', 'name-space'], ['a lone half of a pair', 'Grill\ud8001', 'name-invisible'],
  ])('lets %s through, which nobody can see', (_, name, code) => {
    expect(stopsOf(name)).toEqual([code]);
  });

  it('con is a device of Windows', () => {
    expect(stopsOf('con')).toEqual(['name-reserved']);
  });
});

it.each([
  ['CON'], ['PRN'], ['AUX'], ['NUL'], ['nul.txt'], ['Lpt1.x'],
  ...Array.from({ length: 9 }, (_, index) => [`COM${index + 1}`]), ...Array.from({ length: 9 }, (_, index) => [`lpt${index + 1}`]),
])('%s is reserved by Windows', (name) => {
  expect(stopsOf(name)).toContain('name-reserved');
});

it.each([['COM0'], ['COM10'], ['CONE'], ['LPT'], ['NULL']])('%s is not', (name) => {
  expect(stopsOf(name)).toEqual([]);
});

/** Microsoft KB 2444599: with its path, a shared printer's name has fewer than 31 characters. */
it.each([
  ['A'.repeat(31), []], ['A'.repeat(32), ['name-too-long']], [`${'ü'.repeat(15)}A`, []], ['ü'.repeat(16), ['name-too-long']],
] as const)('%s is measured in bytes', (name, stops) => {
  expect(stopsOf(name)).toEqual(stops);
});
