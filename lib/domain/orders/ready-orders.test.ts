import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aGroup, anItem, anOption, aPlan, aRule, aSection, aSite, aStation, aPrinter, aTill } from '@/tests/fixtures/build-site';
import { generated } from '@/tests/fixtures/generated-site';
import { asId, type CourseId } from '@/lib/domain/site/ids';
import { allWell } from '@/lib/domain/site/present';
import { readyOrderKeys, readyOrders } from './ready-orders';
import { refuseOrder } from './refuse-order';
import { tryOrder } from './try-order';

const courses = ['Drinks', 'Starters', 'Mains', 'Desserts'].map((name) => ({ id: asId<CourseId>(name), name }));
const site = aSite({
  courses,
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }, { id: asId('bar'), name: 'Bar counter', version: 1 }, { id: asId('terrace'), name: 'Terrace', version: 1 }],
  tills: [aTill('Till 1', 'room', '10.20.30.11'), aTill('Bar till', 'bar', '10.20.30.12'), aTill('Handheld', 'terrace', '10.20.30.13', { kind: 'handheld' })],
  stations: [aStation('Grill', ['GRILL1']), aStation('Larder', ['LARDER1'])],
  printers: [aPrinter('GRILL1', '10.20.30.201'), aPrinter('LARDER1', '10.20.30.202')],
  menu: {
    sections: [aSection('Salads'), aSection('Burgers'), aSection('Desserts'), aSection('Wine')],
    items: [
      anItem('Beetroot salad', 'Salads', { course: asId('Starters') }),
      anItem('House burger', 'Burgers', { course: asId('Mains'), optionGroups: [asId('Cooking'), asId('Sides')] }),
      anItem('Sold out steak', 'Burgers', { course: asId('Mains'), soldOut: true }),
      anItem('Flan', 'Desserts', { course: asId('Desserts') }),
      anItem('Picpoul', 'Wine', { course: asId('Drinks') }),
    ],
    optionGroups: [aGroup('Cooking', ['Rare', 'Medium'], { min: 1 }), aGroup('Sides', ['Fries', 'Side salad'])],
    options: [anOption('Rare', 'Cooking'), anOption('Medium', 'Cooking'), anOption('Fries', 'Sides'), anOption('Side salad', 'Sides')],
  },
});
const plan = aPlan([
  aRule('everything', 'send', { kind: 'everything' }, ['Grill']),
  aRule('salad', 'split', { kind: 'option', option: asId('Side salad') }, ['Larder']),
  aRule('terrace', 'send', { kind: 'section', section: asId('Desserts') }, ['Larder'], { areas: [asId('terrace')] }),
]);

const ready = Object.fromEntries(readyOrders(site, plan).map((one) => [one.key, one]));

describe('the six ready orders', () => {
  it('are six, each once', () => {
    expect(readyOrders(site, plan).map(({ key }) => key)).toEqual([...readyOrderKeys]);
  });

  it('seat four at a table, each with three courses, one with an allergy', () => {
    const { name, order } = ready['table-of-four']!;
    expect(name).toBe('A table of four, three courses and an allergy');
    for (const seat of [1, 2, 3, 4]) expect(order.lines.filter((line) => line.seat === seat)).toHaveLength(3);
    expect(order.allergies).toEqual([{ seat: 2, words: 'Tree nuts' }]);
  });

  it('order drinks from the bar and nothing else', () => {
    expect(ready.drinks!.order).toMatchObject({ till: 'Bar till', lines: [{ item: 'Picpoul' }] });
  });

  it('choose the dish whose option another station makes, and name both', () => {
    expect(ready['split-dish']).toMatchObject({ name: 'House burger with side salad', says: 'One dish that two stations make.' });
    expect(ready['split-dish']!.order.lines[0]!.options).toEqual(['Rare', 'Side salad']);
  });

  it('leave without a table when taken away', () => {
    expect(ready['take-away']!.order).toMatchObject({ orderType: 'take-away', table: '' });
  });

  it('try one item of every section, never one that is sold out', () => {
    expect(ready['every-section']!.order.lines.map(({ item }) => item)).toEqual(['Beetroot salad', 'House burger', 'Flan', 'Picpoul']);
  });

  it('come late from the till that the plan treats apart', () => {
    expect(ready['late-table']!.order).toMatchObject({ till: 'Handheld', lines: [{ item: 'Flan', note: 'no nuts please' }, { item: 'Picpoul' }] });
  });

  it('are none on a site without tills or without a menu', () => {
    expect(readyOrders(aSite(), plan)).toEqual([]);
    expect(readyOrders({ ...site, tills: [] }, plan)).toEqual([]);
  });

  it('are never refused, on any site', () => {
    fc.assert(fc.property(generated, ({ site: anySite, plan: anyPlan }) => {
      for (const { order } of readyOrders(anySite, anyPlan)) {
        if (order.lines.length === 0) continue;
        expect(refuseOrder(order, anySite)).toEqual([]);
        expect(tryOrder(anySite, anyPlan, allWell, order, { time: '19:42' }).lines.filter(({ outcome }) => outcome === 'refused')).toEqual([]);
      }
    }), { seed: 20261201, numRuns: 150 });
  });
});
