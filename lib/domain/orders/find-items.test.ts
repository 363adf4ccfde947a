import { describe, expect, it } from 'vitest';
import { anItem, aSection } from '@/tests/fixtures/build-site';
import { findItems, readSearch } from './find-items';

const menu = {
  sections: [aSection('starters', { name: 'Starters' }), aSection('desserts', { name: 'Desserts' })],
  items: [
    anItem('1', 'starters', { name: 'Smoked crab toast' }), anItem('2', 'starters', { name: 'Crab toast', kitchenName: 'CRB TST' }),
    anItem('3', 'desserts', { name: 'Crème brûlée' }), anItem('4', 'desserts', { name: 'Scrabble cake' }),
  ],
};
const found = (typed: string): readonly string[] => findItems(menu, readSearch(typed)).map(({ name }) => name);

describe('finding an item while an order is typed', () => {
  it.each([
    ['crab', ['Crab toast', 'Smoked crab toast', 'Scrabble cake']],
    ['toast crab', ['Smoked crab toast', 'Crab toast']],
    ['creme brulee', ['Crème brûlée']],
    ['CRB', ['Crab toast']],
    ['dessert', ['Crème brûlée', 'Scrabble cake']],
    ['ghost', []],
    ['', ['Smoked crab toast', 'Crab toast', 'Crème brûlée', 'Scrabble cake']],
  ])('%j finds %j', (typed, names) => {
    expect(found(typed)).toEqual(names);
  });

  it.each([
    ['3 crab', 3, ['crab']],
    ['12x crab toast', 12, ['crab', 'toast']],
    ['2 x crab', 2, ['crab']],
    ['0 crab', 1, ['crab']],
    ['7', 1, ['7']],
    ['crab 3', 1, ['crab', '3']],
  ])('%j asks for %i of %j', (typed, quantity, words) => {
    expect(readSearch(typed)).toEqual({ quantity, words });
  });
});
