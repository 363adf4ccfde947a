import { describe, expect, it } from 'vitest';
import { anItem } from '@/tests/fixtures/build-site';
import { changedItemFields, itemDifferences, mergeItem, sayItemChange, type ItemFields } from './item-differences';

const naming = { sections: [{ id: 'grill', name: 'From the grill' }, { id: 'fish', name: 'Fish' }], courses: [{ id: 'mains', name: 'Mains' }], groups: [{ id: 'steak', name: 'Steak' }, { id: 'side', name: 'Side' }] };
const ribeye: ItemFields = anItem('ribeye', 'grill', { name: 'Ribeye', allergens: ['milk', 'nuts'] });

describe('a change of an item', () => {
  it.each<readonly [string, Partial<ItemFields>, string]>([
    ['selling out', { soldOut: true }, 'Ribeye is sold out'],
    ['a new name', { name: 'Rib steak' }, 'Ribeye renamed to Rib steak'],
    ['another menu section', { section: 'fish' }, 'Ribeye moved from From the grill to Fish'],
    ['several fields', { kitchenName: 'RIB', course: 'mains', left: 4, optionGroups: ['steak', 'side'] }, 'Ribeye: kitchen name nothing to RIB; course none to Mains; options none to Steak, Side; left nothing to 4'],
    ['nothing', {}, 'Ribeye saved without a change'],
  ])('is one line of history: %s', (_, change, line) => {
    expect(sayItemChange(ribeye, { ...ribeye, ...change }, naming)).toBe(line);
  });

  it('counts the order of options, and not that of allergens', () => {
    const both = { ...ribeye, optionGroups: ['steak', 'side'] };
    expect(changedItemFields(both, { ...both, optionGroups: ['side', 'steak'], allergens: ['nuts', 'milk'] })).toEqual(['optionGroups']);
    expect(itemDifferences(ribeye, { ...ribeye, allergens: [] }, naming)).toEqual([{ field: 'allergens', label: 'Allergens', from: 'milk, nuts', to: 'none' }]);
  });

  it('is put on top of what somebody else changed, and takes nothing of theirs along', () => {
    expect(mergeItem(ribeye, { ...ribeye, kitchenName: 'RIB' }, { ...ribeye, soldOut: true, name: 'Rib steak' })).toEqual({ ...ribeye, kitchenName: 'RIB', soldOut: true, name: 'Rib steak' });
  });
});
