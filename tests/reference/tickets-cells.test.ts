import { describe, expect, it } from 'vitest';
import { cellsOf, graphemesOf } from '@/lib/domain/tickets/cells';

/** Graphemes by Unicode Standard Annex 29, cells by Annex 11 (wide and full width two, ambiguous one). */
describe('width in cells of graphemes', () => {
  it.each([
    ['Crème brûlée', 12, 12],
    ['Cre\u0300me', 5, 5],
    ['厨房', 2, 4],
    ['ｶﾀｶﾅ', 4, 4],
    ['カタカナ', 4, 8],
    ['ＡＢＣ', 3, 6],
    ['🍕', 1, 2],
    ['👩‍🍳', 1, 2],
    ['🇮🇪', 1, 2],
    ['👍🏽', 1, 2],
    ['👨‍👩‍👧‍👦', 1, 2],
    ['☕', 1, 2],
    ['한', 1, 2],
    ['\u1112\u1161\u11ab', 1, 2],
    ['नि', 1, 2],
    ['ไทย', 3, 3],
    ['½€é™①—…ΩЖ', 9, 9],
  ])('%s has %i graphemes in %i cells', (text, graphemes, cells) => {
    expect([graphemesOf(text).length, cellsOf(text)]).toEqual([graphemes, cells]);
  });
});
