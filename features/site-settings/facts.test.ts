import { describe, expect, it } from 'vitest';
import { settingDifferences } from './facts';

const courses = (...names: readonly string[]) => ({ courses: names.map((name) => ({ id: name, name })) });
const naming = { tills: [] };

describe('what is said to differ between two values of a part', () => {
  it.each<readonly [string, readonly string[], readonly string[], readonly object[]]>([
    ['nothing where nothing does', ['Starters', 'Mains'], ['Starters', 'Mains'], []],
    ['of a list only what came', ['Starters', 'Mains'], ['Starters', 'Mains', 'Cheese'], [{ label: 'Courses', from: '2', to: '3, with Cheese' }]],
    ['of a list only what went', ['Starters', 'Mains'], ['Mains'], [{ label: 'Courses', from: '2', to: '1, without Starters' }]],
    ['both, where one took another’s place', ['Starters', 'Mains'], ['Bites', 'Mains'], [{ label: 'Courses', from: '2', to: '2, with Bites, without Starters' }]],
    ['that only the order is another', ['Starters', 'Mains'], ['Mains', 'Starters'], [{ label: 'Courses', from: '2', to: '2, in another order' }]],
    ['that there are none any more', ['Starters'], [], [{ label: 'Courses', from: '1', to: '0, without Starters' }]],
  ])('is %s', (_what, before, after, said) => {
    expect(settingDifferences('courses', courses(...before), courses(...after), naming)).toEqual(said);
  });

  it('is the value itself where it is no list, and nothing of what is not kept', () => {
    const own = { kind: 'own' as const, till: '', address: '10.20.30.50', mask: '255.255.255.0' };
    expect(settingDifferences('link', { ...own, kind: 'none' }, own, naming)).toEqual([
      { label: 'Runs', from: 'No print link', to: 'On a device of its own' }, { label: 'Address', from: 'None', to: '10.20.30.50' }, { label: 'Mask', from: 'None', to: '255.255.255.0' },
    ]);
    expect(settingDifferences('link', { ...own, kind: 'none' }, { ...own, kind: 'none', address: '10.20.30.51' }, naming)).toEqual([]);
  });
});
