import { describe, expect, it } from 'vitest';
import { aGroup, anItem, aSection, aSite, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import { addLine, changeLine, emptyOrder, fromTill, removeLine, sayAllergy, seatsOf, takeBackAllergy, toggleOption } from './edit-order';
import { newLine } from './order-line';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('phone', 'room', '', { kind: 'online', orderTypes: ['delivery'] }), aTill('till', 'room', '10.20.30.11')],
  menu: { sections: [aSection('Burgers')], items: [anItem('burger', 'Burgers')] },
});
const order = emptyOrder(site);
const burger = newLine(site.menu.items[0]!, site);

describe('writing an order', () => {
  it('begins at a fixed till', () => {
    expect(order).toMatchObject({ till: 'till', orderType: 'eat-in', lines: [] });
  });

  it('takes an order type that the till can send, and the till’s own area', () => {
    expect(fromTill({ ...order, area: asId('room') }, site, asId('phone'))).toEqual({ ...order, till: 'phone', orderType: 'delivery' });
  });

  it('adds, changes and removes a line in its place', () => {
    const two = addLine(addLine(order, burger), burger);
    expect(changeLine(two, 1, { quantity: 3 }).lines.map(({ quantity }) => quantity)).toEqual([1, 3]);
    expect(removeLine(changeLine(two, 1, { quantity: 3 }), 0).lines.map(({ quantity }) => quantity)).toEqual([3]);
  });

  it.each([
    ['replaces in a group of one', { min: 1, max: 1 }, ['rare'], 'medium', ['medium']],
    ['keeps the one that must be chosen', { min: 1, max: 1 }, ['rare'], 'rare', ['rare']],
    ['takes off what may be left out', { min: 0, max: 1 }, ['rare'], 'rare', []],
    ['adds where several may be chosen', { min: 0, max: 3 }, ['rare'], 'medium', ['rare', 'medium']],
    ['leaves other groups alone', { min: 0, max: 1 }, ['ice', 'rare'], 'medium', ['ice', 'medium']],
  ])('choosing an option %s', (_, limits, before, option, after) => {
    const group = aGroup('cooking', ['rare', 'medium'], limits);
    expect(toggleOption({ ...burger, options: before.map((id) => asId(id)) }, group, asId(option))).toEqual(after);
  });

  it('hears an allergy once, and takes it back', () => {
    const said = sayAllergy(sayAllergy(order, { seat: 2, words: ' Tree nuts ' }), { seat: 2, words: 'tree nuts' });
    expect(said.allergies).toEqual([{ seat: 2, words: 'Tree nuts' }]);
    expect(takeBackAllergy(said, { seat: 2, words: 'Tree nuts' }).allergies).toEqual([]);
    expect(sayAllergy(order, { seat: null, words: '  ' })).toBe(order);
  });

  it('offers a seat for each cover and every seat spoken of', () => {
    expect(seatsOf({ ...order, covers: 2, lines: [{ ...burger, seat: 4 }] })).toEqual([1, 2, 3, 4]);
    expect(seatsOf({ ...order, covers: null, lines: [{ ...burger, seat: 400 }] })).toEqual([1, 400]);
  });
});
