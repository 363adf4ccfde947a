import { describe, expect, it } from 'vitest';
import { readyOrders } from '@/lib/domain/orders/ready-orders';
import type { Order } from '@/lib/domain/orders/order';
import { tryOrder } from '@/lib/domain/orders/try-order';
import { asId } from '@/lib/domain/site/ids';
import { allWell } from '@/lib/domain/site/present';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { brokenLines, headline, refusedLines, unprintableWords } from './verdict-words';
import { lineDetail, lineState } from './words';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('till', 'room', '10.20.30.11', { orderTypes: ['eat-in'] })],
  stations: [aStation('Grill', ['GRILL1']), aStation('Pastry', ['FAR1'])],
  printers: [aPrinter('GRILL1', '10.20.30.201'), aPrinter('FAR1', '10.99.0.1')],
  menu: {
    sections: [aSection('Burgers'), aSection('Desserts'), aSection('Vouchers')],
    items: [
      anItem('burger', 'Burgers', { name: 'House burger', optionGroups: [asId('sides')] }), anItem('flan', 'Desserts', { name: 'Flan' }),
      anItem('steak', 'Burgers', { name: 'Steak', soldOut: true }), anItem('gift', 'Vouchers', { name: 'Gift card', noTicket: true }),
    ],
    optionGroups: [aGroup('sides', ['cake'])],
    options: [anOption('cake', 'sides', { name: 'Small cake' })],
  },
});
const plan = aPlan([
  aRule('all', 'send', { kind: 'everything' }, ['Grill']),
  aRule('desserts', 'send', { kind: 'section', section: asId('Desserts') }, ['Pastry']),
  aRule('cake', 'split', { kind: 'option', option: asId('cake') }, ['Pastry']),
]);
const line = (item: string, more: Partial<Order['lines'][number]> = {}): Order['lines'][number] => ({ item: asId(item), quantity: 1, options: [], seat: null, course: null, note: '', allergies: [], ...more });
const orderOf = (lines: readonly Order['lines'][number][], more: Partial<Order> = {}): Order => ({ till: asId('till'), orderType: 'eat-in', table: '14', covers: 2, server: '', number: '', allergies: [], lines, ...more });
const tried = (order: Order) => tryOrder(site, plan, allWell, order, { time: '19:42' });

describe('the sentence over a tried order', () => {
  it.each<[string, Order, string, string]>([
    ['a whole order', orderOf([line('burger')]), 'well', 'Everything prints: 1 ticket from 1 printer'],
    ['a lost line before a part lost one', orderOf([line('burger', { options: [asId('cake')] }), line('flan')]), 'lost', '1 line would print nowhere'],
    ['a line lost in part', orderOf([line('burger', { options: [asId('cake')] })]), 'lost', '1 line would print only in part'],
    ['a line that is sold out', orderOf([line('burger'), line('steak')]), 'look', '1 line is refused, the rest prints: 1 ticket from 1 printer'],
    ['lines that cannot be', orderOf([line('burger', { quantity: 0 }), line('ghost')]), 'look', '2 lines are refused'],
    ['an order that its till does not send', orderOf([line('burger')], { orderType: 'delivery' }), 'look', 'This order cannot be sent'],
    ['an allergy in letters that the printer lacks', orderOf([line('burger', { allergies: ['орехи'] })]), 'lost', 'An allergy would not print as it was said'],
    ['what needs no ticket', orderOf([line('gift')]), 'well', 'Nothing prints for this order'],
  ])('tells of %s', (_, order, tone, words) => {
    expect(headline(tried(order))).toEqual({ tone, words });
  });

  it('counts a line once, however often it is refused', () => {
    expect(refusedLines(tried(orderOf([line('burger', { quantity: 0, seat: 0 }), line('steak')])))).toBe(2);
  });

  it('names what is lost once for each item, with how many and why', () => {
    const order = orderOf([line('flan', { quantity: 2, seat: 1 }), line('burger'), line('flan', { seat: 2 })]);
    expect(brokenLines(site, order, tried(order))).toEqual([
      { first: 0, name: 'Flan', quantity: 3, reasons: [expect.stringContaining('till does not reach FAR1')] },
    ]);
  });

  it('names the printer, the character and what comes instead, allergies first', () => {
    const [first, second] = unprintableWords(tried(orderOf([line('burger', { note: 'très — rare', allergies: ['ж'] })])));
    expect(first).toEqual({ allergy: true, words: 'GRILL1 has no “ж”: the allergy “ж” would print with “ZH” instead.' });
    expect(second).toEqual({ allergy: false, words: 'GRILL1 has no “—”: “très — rare” would print with “-” instead.' });
  });

  it('is ready for every ready order', () => {
    for (const { order } of readyOrders(site, plan)) expect(headline(tried(order)).words).not.toBe('');
  });
});

describe('the words beside a line', () => {
  it.each<[string, Order['lines'][number], string | undefined]>([
    ['nothing when it prints', line('burger'), undefined],
    ['that it prints nowhere', line('flan'), 'Prints nowhere.'],
    ['that it prints in part', line('burger', { options: [asId('cake')] }), 'Prints only in part.'],
    ['that it is sold out', line('steak'), 'Steak is sold out. Nothing is sent for this line.'],
    ['that it needs no ticket', line('gift'), 'Needs no ticket.'],
    ['why it cannot be', line('burger', { quantity: 1000 }), '1000 of House burger cannot be ordered. Say a whole number from 1 to 999.'],
  ])('say %s', (_, one, words) => {
    expect(lineState(tried(orderOf([one])), 0)?.words).toBe(words);
  });

  it('tell seat, options and note', () => {
    expect(lineDetail(site, line('burger', { seat: 4, options: [asId('cake')], note: 'well done', held: true }))).toBe('Seat 4, small cake, well done, held');
  });
});
