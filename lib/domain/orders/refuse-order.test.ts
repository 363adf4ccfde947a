import { describe, expect, it } from 'vitest';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import { allWell } from '@/lib/domain/site/present';
import type { Order, OrderLine } from './order';
import { refuseOrder } from './refuse-order';
import { tryOrder } from './try-order';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  courses: [{ id: asId('mains'), name: 'Mains' }],
  tills: [aTill('till', 'room', '10.20.30.11', { orderTypes: ['eat-in'] })],
  stations: [aStation('Grill', ['GRILL1'])],
  printers: [aPrinter('GRILL1', '10.20.30.201')],
  menu: {
    sections: [aSection('Burgers')],
    items: [anItem('burger', 'Burgers', { name: 'House burger', optionGroups: [asId('cooking')] })],
    optionGroups: [aGroup('cooking', ['rare', 'medium'], { name: 'Cooking', min: 1, max: 1 })],
    options: [anOption('rare', 'cooking'), anOption('medium', 'cooking'), anOption('ice', 'other', { name: 'Ice' })],
  },
});

const line = (more: Partial<OrderLine> = {}): OrderLine => ({
  item: asId('burger'), quantity: 1, options: [asId('rare')], seat: 1, course: null, note: '', allergies: [], ...more,
});
const order = (lines: readonly OrderLine[], more: Partial<Order> = {}): Order => ({
  till: asId('till'), orderType: 'eat-in', table: '14', covers: 2, server: 'Ana', number: '0231', allergies: [], lines, ...more,
});

const codesFor = (refused: Order) => refuseOrder(refused, site).map(({ line: index, code }) => [index, code]);

describe('an order that no plan could route', () => {
  it('passes when nothing is wrong', () => {
    expect(refuseOrder(order([line()]), site)).toEqual([]);
  });

  it.each<[string, Partial<OrderLine>, string]>([
    ['an unknown item', { item: asId('ghost') }, 'unknown-item'],
    ['none of it', { quantity: 0 }, 'quantity-outside'],
    ['a thousand of it', { quantity: 1000 }, 'quantity-outside'],
    ['half of it', { quantity: 0.5 }, 'quantity-outside'],
    ['a number that is none', { quantity: Number.NaN }, 'quantity-outside'],
    ['seat zero', { seat: 0 }, 'seat-outside'],
    ['an unknown course', { course: asId('brunch') }, 'unknown-course'],
    ['too few options', { options: [] }, 'too-few-options'],
    ['too many options', { options: [asId('rare'), asId('medium')] }, 'too-many-options'],
    ['an option of another dish', { options: [asId('rare'), asId('ice')] }, 'option-not-of-item'],
  ])('refuses %s, on its line', (_, fault, code) => {
    expect(codesFor(order([line(), line(fault)]))).toEqual([[1, code]]);
  });

  it('refuses an option chosen twice', () => {
    expect(codesFor(order([line({ options: [asId('rare'), asId('rare')] })]))).toContainEqual([0, 'option-twice']);
  });

  it.each<[string, Partial<Order>, string]>([
    ['an unknown till', { till: asId('ghost') }, 'unknown-till'],
    ['a type that the till does not send', { orderType: 'delivery' }, 'order-type-not-sent'],
    ['an unknown area', { area: asId('moon') }, 'unknown-area'],
    ['an allergy of a seat that cannot be', { allergies: [{ seat: -1, words: 'nuts' }] }, 'seat-outside'],
  ])('refuses %s as a whole', (_, fault, code) => {
    expect(codesFor(order([line()], fault))).toEqual([[null, code]]);
  });

  it('refuses an empty order', () => {
    expect(codesFor(order([]))).toEqual([[null, 'no-lines']]);
  });

  it('says every fault at once, each in a sentence that says what to do', () => {
    const refusals = refuseOrder(order([line({ quantity: 0, options: [] }), line({ item: asId('ghost') })]), site);
    expect(refusals.map(({ line: index }) => index)).toEqual([0, 0, 1]);
    for (const { message } of refusals) expect(message).toMatch(/^[A-Z0-9][^!]*\.$/);
  });
});

describe('trying an order with an impossible line', () => {
  const plan = aPlan([aRule('all', 'send', { kind: 'everything' }, ['Grill'])]);
  const tried = tryOrder(site, plan, allWell, order([line({ quantity: 0 }), line({ quantity: 2 })]), { time: '19:42' });

  it('routes the other lines under their own numbers', () => {
    expect(tried.lines.map(({ line: index, outcome }) => [index, outcome])).toEqual([[1, 'prints']]);
    expect(tried.tickets[0]!.ticket.courses[0]!.lines[0]).toMatchObject({ sourceLine: 1, quantity: 2 });
    expect(tried.refusals).toHaveLength(1);
  });

  it('routes nothing when the order itself cannot be', () => {
    expect(tryOrder(site, plan, allWell, order([line()], { till: asId('ghost') }), { time: '19:42' })).toMatchObject({ lines: [], tickets: [] });
  });
});
