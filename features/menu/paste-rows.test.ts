import { describe, expect, it } from 'vitest';
import { pasteBlock, readBlock } from './paste-rows';
import type { ItemInput } from './schema';

const blank: ItemInput = { section: 's', name: '', kitchenName: '', allergens: [], course: null, preparationSeconds: null, soldOut: false, left: null, noTicket: false, optionGroups: [] };
const items = [{ ...blank, name: 'Tart' }, { ...blank, name: 'Ices' }];
const courses = [{ id: 'c1', name: 'Desserts' }];

describe('pasting into the menu', () => {
  it('leaves one cell to the text box', () => {
    expect(readBlock('Lemon tart')).toBeNull();
    expect(readBlock('Lemon tart\n')).toBeNull();
  });

  it('fills lines that are there and adds the rest', () => {
    const block = readBlock('Pear\tPEAR\tdesserts\t120\nPlum\tPLUM\t\tsoon\r\n')!;
    expect(pasteBlock(items, { row: 1, column: 'name' }, block, blank, courses)).toEqual({
      updates: [{ index: 1, input: { ...items[1], name: 'Pear', kitchenName: 'PEAR', course: 'c1', preparationSeconds: 120 } }],
      creates: [{ ...blank, name: 'Plum', kitchenName: 'PLUM' }],
    });
  });

  it('adds no line without a name, and changes nothing that is the same', () => {
    expect(pasteBlock(items, { row: 0, column: 'kitchenName' }, [[''], [''], ['X']], blank, courses)).toEqual({ updates: [], creates: [] });
  });
});
