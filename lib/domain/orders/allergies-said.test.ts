import { describe, expect, it } from 'vitest';
import { anItem, anOption, aSection, aSite } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import { allergens } from '@/lib/domain/site/menu';
import { allergensMet } from './allergens-met';
import { allergyInNote } from './allergy-in-note';
import { allergensSaid, allergyWords } from './allergy-words';
import type { Order, OrderLine } from './order';

describe('words about allergies', () => {
  it('know each of the fourteen by the words it prints as', () => {
    for (const allergen of allergens) expect(allergensSaid(allergyWords[allergen])).toContain(allergen);
  });

  it.each([
    ['no walnuts', 'Tree nuts'],
    ['without egg or milk', 'Eggs, Milk'],
    ['nut allergy at this seat', 'Tree nuts'],
    ['Coeliac', 'Gluten'],
    ['gluten-free please', 'Gluten'],
    ['allergic to kiwi', 'allergic to kiwi'],
    ['no shellfish', 'Crustaceans, Molluscs'],
    ['extra walnuts', null],
    ['no onion', null],
    ['well done, no hurry', null],
    ['no doughnuts', null],
    ['', null],
  ])('take the note %j for %j', (note, offered) => {
    expect(allergyInNote(note)).toBe(offered);
  });

  it('tell peanuts from tree nuts', () => {
    expect(allergensSaid('peanuts')).toEqual(['peanuts']);
    expect(allergensSaid('tree nuts')).toEqual(['nuts']);
  });
});

describe('a dish that holds what its guest may not eat', () => {
  const site = aSite({ menu: {
    sections: [aSection('Salads')],
    items: [anItem('salad', 'Salads', { name: 'Beetroot salad', allergens: ['nuts', 'milk'] })],
    options: [anOption('dressing', 'group', { name: 'Mustard dressing', allergens: ['mustard'] })],
  } });
  const line = (seat: number | null, more: Partial<OrderLine> = {}): OrderLine => ({
    item: asId('salad'), quantity: 1, options: [asId('dressing')], seat, course: null, note: '', allergies: [], ...more,
  });
  const order = (lines: readonly OrderLine[], allergies: Order['allergies']): Order => ({
    till: asId('till'), orderType: 'eat-in', table: '', covers: null, server: '', number: '', lines, allergies,
  });

  it('is found at the seat of which it was said, and at no other', () => {
    expect(allergensMet(order([line(1), line(2)], [{ seat: 2, words: 'hazelnuts' }]), site).map(({ line: at, allergen }) => [at, allergen])).toEqual([[1, 'nuts']]);
  });

  it('is found on every line when it was said of the table, options included', () => {
    expect(allergensMet(order([line(1), line(null)], [{ seat: null, words: 'Mustard' }]), site)).toEqual([0, 1].map((at) => ({
      line: at, allergen: 'mustard', message: 'Mustard dressing contains mustard, which was said as an allergy. Ask before it is sent.',
    })));
  });

  it('is found when it was said of the line alone', () => {
    expect(allergensMet(order([line(1, { allergies: ['dairy'] })], []), site).map(({ allergen }) => allergen)).toEqual(['milk']);
  });
});
