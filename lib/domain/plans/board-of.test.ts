import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asId } from '../site/ids';
import type { Rule } from '../site/plan';
import { boardOf } from './board-of';
import { anyContent } from '@/tests/fixtures/generated-plans';
import { printingItems } from './hanging';
import { burgers, contentOf, oysters, rule, sideSalad, smallSite, steakRoll } from '@/tests/fixtures/small-plan-site';

const shown = (...rules: readonly Rule[]): Record<string, readonly string[]> =>
  Object.fromEntries(boardOf(smallSite, contentOf(...rules)).rails.map((rail) => [rail.station, rail.cards.map((card) => `${card.name}, ${card.under}`)]));

describe('a board', () => {
  it('hangs a section on each of its rails with the items that really cook there', () => {
    const board = shown(rule('r1', 'send', burgers, ['grill', 'bar']), rule('r2', 'send', steakRoll, ['larder']));
    expect(board).toEqual({
      grill: ['Burgers, 2 items'], larder: ['Steak roll, of Burgers'], bar: ['Burgers, 2 items'], pass: [],
    });
  });

  it('counts on a rail what its cards cook', () => {
    const { rails } = boardOf(smallSite, contentOf(rule('r1', 'send', burgers, ['grill']), rule('r2', 'send', steakRoll, ['grill', 'larder'])));
    expect(rails.map((rail) => rail.items)).toEqual([3, 1, 0, 0]);
  });

  it('lays a section in the tray while any of its items prints nowhere, and counts only those', () => {
    const { tray } = boardOf(smallSite, contentOf(rule('r1', 'send', steakRoll, ['grill'])));
    expect(tray.map((card) => `${card.name}, ${card.under}`)).toEqual(['Burgers, 2 items', 'Oysters, 2 items']);
  });

  it('keeps a section of vouchers out of the tray: they need no station', () => {
    expect(boardOf(smallSite, contentOf()).tray.map((card) => card.name)).not.toContain('Vouchers');
  });

  it('says in the tray where a section prints at times only', () => {
    const { tray } = boardOf(smallSite, contentOf(rule('r1', 'send', oysters, ['bar'], { areas: [asId('terrace')] })));
    expect(tray.find((card) => card.name === 'Oysters')?.notes).toEqual(['only Terrace, at Bar']);
  });

  it('lets a rule for everything cook what nothing narrower takes', () => {
    expect(shown(rule('r1', 'send', burgers, ['grill']), rule('r2', 'send', { kind: 'everything' }, ['larder']))).toMatchObject({
      grill: ['Burgers, 3 items'], larder: ['Everything, 2 items'],
    });
  });

  it('says on the card what splits, what prints elsewhere at times, and which items go their own way', () => {
    const { rails } = boardOf(smallSite, contentOf(
      rule('r1', 'send', burgers, ['grill']),
      rule('r2', 'split', sideSalad, ['larder']),
      rule('r3', 'send', burgers, ['bar'], { areas: [asId('terrace')], orderTypes: ['take-away'] }),
      rule('r4', 'send', steakRoll, ['larder']),
    ));
    expect(rails[0]?.cards[0]?.notes).toEqual(['side salad splits to Larder', 'take away from Terrace prints at Bar', 'Steak roll to Larder']);
    expect(rails[2]?.cards[0]).toMatchObject({ name: 'Burgers', tags: ['take away', 'Terrace'], under: 'only then', items: 0, notes: [] });
  });

  it('says nothing of a split to where the dish cooks anyway', () => {
    const { rails } = boardOf(smallSite, contentOf(rule('r1', 'send', burgers, ['larder']), rule('r2', 'split', sideSalad, ['larder'])));
    expect(rails[1]?.cards[0]?.notes).toEqual([]);
  });

  it('hangs a copy with the order its ticket is read in', () => {
    const { rails } = boardOf(smallSite, contentOf(rule('r1', 'copy', { kind: 'everything' }, ['pass'])));
    expect(rails[3]).toMatchObject({ wholeOrder: true, items: 0 });
    expect(rails[3]?.cards[0]).toMatchObject({ name: 'Everything', under: 'copy, by seat', kind: 'copy' });
  });

  it('takes a section that is not offered off the rails and lists it with its rule', () => {
    const board = boardOf(smallSite, { ...contentOf(rule('r1', 'send', oysters, ['grill'])), offers: [asId('burgers'), asId('vouchers')] });
    expect(board.rails[0]?.cards).toEqual([]);
    expect(board.notOffered).toEqual([{ section: 'oysters', name: 'Oysters', items: 2 }]);
    expect(board.unseen).toEqual(['r1']);
  });
});

describe('on any plan', () => {
  it('each offered item that prints is counted on the rails of one rule or in the tray, never in both', () => {
    fc.assert(fc.property(anyContent, (content) => {
      const board = boardOf(smallSite, content);
      const once = new Map(board.rails.flatMap((rail) => rail.cards).filter((card) => card.kind === 'send').map((card) => [card.rule, card.items]));
      const onRails = [...once.values()].reduce((sum, items) => sum + items, 0);
      const inTray = board.tray.reduce((sum, card) => sum + card.items, 0);
      expect(onRails + inTray).toBe(printingItems(smallSite, content).length);
    }), { seed: 20261201 });
  });

  it('no two cards share an id', () => {
    fc.assert(fc.property(anyContent, (content) => {
      const board = boardOf(smallSite, content);
      const ids = [...board.tray, ...board.rails.flatMap((rail) => rail.cards)].map((card) => card.id);
      expect(new Set(ids).size).toBe(ids.length);
    }), { seed: 20261201 });
  });
});
