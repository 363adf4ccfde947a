import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { RuleId, StationId } from '../site/ids';
import { asId } from '../site/ids';
import { anyCondition } from '../site/plan';
import { applyEdit, inverseOf } from './apply-edit';
import type { PlanEdit } from './edit';
import { anyContent, anyEdit } from '@/tests/fixtures/generated-plans';
import { burgers, contentOf, counting, oysters, rule, sideSalad, steakRoll } from '@/tests/fixtures/small-plan-site';

const grill = asId<StationId>('grill');
const larder = asId<StationId>('larder');
const bar = asId<StationId>('bar');
const pass = asId<StationId>('pass');
const onTerrace = { areas: [asId<never>('terrace')] };
const send = (how: 'replace' | 'add' | 'remove', ...stations: readonly StationId[]): PlanEdit =>
  ({ kind: 'send', targets: [burgers], conditions: anyCondition, how, stations });
const stationsOf = (content: ReturnType<typeof applyEdit>): readonly string[] => content.rules.map((each) => `${each.kind} ${each.stations.join('+')}`);

describe('sending', () => {
  const atGrill = contentOf(rule('r1', 'send', burgers, ['grill']));

  it('makes a rule for what had none, last in order', () => {
    const after = applyEdit(atGrill, { kind: 'send', targets: [oysters], conditions: anyCondition, how: 'replace', stations: [larder] }, counting());
    expect(after.rules.at(-1)).toEqual(rule('new-1', 'send', oysters, ['larder']));
  });

  it.each([
    ['replaces the stations and keeps the rule', send('replace', larder, bar), ['send larder+bar']],
    ['adds a station once', send('add', grill, larder), ['send grill+larder']],
    ['removes the rule with its last station', send('remove', grill), []],
    ['removes nothing that is not there', send('remove', bar), ['send grill']],
  ])('%s', (_, edit, expected) => {
    expect(stationsOf(applyEdit(atGrill, edit, counting()))).toEqual(expected);
  });

  it('leaves rules with conditions alone', () => {
    const both = contentOf(rule('r1', 'send', burgers, ['grill']), rule('r2', 'send', burgers, ['bar'], onTerrace));
    expect(stationsOf(applyEdit(both, send('replace', larder), counting()))).toEqual(['send larder', 'send bar']);
  });

  it('changes the one of several equal rules that wins, and clears the beaten ones', () => {
    const twice = contentOf(rule('r1', 'send', burgers, ['grill']), rule('r2', 'send', burgers, ['bar']));
    expect(applyEdit(twice, send('add', larder), counting()).rules).toEqual([rule('r2', 'send', burgers, ['bar', 'larder'])]);
  });

  it('takes a section off all stations with its conditional rules, not its items', () => {
    const content = contentOf(rule('r1', 'send', burgers, ['grill']), rule('r2', 'send', burgers, ['bar'], onTerrace), rule('r3', 'send', steakRoll, ['grill']));
    expect(applyEdit(content, { kind: 'take-off', targets: [burgers] }, counting()).rules.map((each) => each.id)).toEqual(['r3']);
  });
});

describe('hanging cards', () => {
  const content = contentOf(rule('r1', 'send', burgers, ['grill', 'bar']), rule('r2', 'copy', { kind: 'everything' }, ['pass']));
  const card = { target: burgers, rule: asId<RuleId>('r1'), from: grill };

  it('moves one card and leaves its other rails', () => {
    expect(stationsOf(applyEdit(content, { kind: 'hang', cards: [card], to: larder }, counting()))).toEqual(['send larder+bar', 'copy pass']);
  });

  it('joins the card that already hangs there', () => {
    expect(stationsOf(applyEdit(content, { kind: 'hang', cards: [card], to: bar }, counting()))).toEqual(['send bar', 'copy pass']);
  });

  it('moves a copy as a copy', () => {
    const copied = { target: { kind: 'everything' } as const, rule: asId<RuleId>('r2'), from: pass };
    expect(stationsOf(applyEdit(content, { kind: 'hang', cards: [copied], to: bar }, counting()))).toEqual(['send grill+bar', 'copy bar']);
  });

  it('takes a card off its rail, and the rule with its last rail', () => {
    const off = applyEdit(content, { kind: 'hang', cards: [card, { ...card, from: bar }], to: null }, counting());
    expect(stationsOf(off)).toEqual(['copy pass']);
  });
});

describe('other edits', () => {
  it('splits an option, changes the split, and lets it go without stations', () => {
    const split: PlanEdit = { kind: 'split', target: sideSalad, conditions: anyCondition, stations: [larder], keep: true };
    const once = applyEdit(contentOf(), split, counting());
    expect(once.rules).toEqual([rule('new-1', 'split', sideSalad, ['larder'], {}, true)]);
    expect(applyEdit(once, { ...split, keep: false }, counting()).rules).toEqual([rule('new-1', 'split', sideSalad, ['larder'])]);
    expect(applyEdit(once, { ...split, stations: [] }, counting()).rules).toEqual([]);
  });

  it('puts a rule above another or last', () => {
    const three = contentOf(rule('a', 'send', burgers, ['grill']), rule('b', 'send', oysters, ['grill']), rule('c', 'send', steakRoll, ['grill']));
    const ids = (edit: PlanEdit): readonly string[] => applyEdit(three, edit, counting()).rules.map((each) => each.id);
    expect(ids({ kind: 'reorder', rule: asId('c'), above: asId('a') })).toEqual(['c', 'a', 'b']);
    expect(ids({ kind: 'reorder', rule: asId('a'), above: null })).toEqual(['b', 'c', 'a']);
    expect(ids({ kind: 'reorder', rule: asId('a'), above: asId('a') })).toEqual(['a', 'b', 'c']);
  });

  it('offers all again when the last missing section is offered', () => {
    const all = [asId<never>('burgers'), asId<never>('oysters')];
    const without = applyEdit(contentOf(), { kind: 'offer', sections: [asId('oysters')], offered: false, all }, counting());
    expect(without.offers).toEqual(['burgers']);
    expect(applyEdit(without, { kind: 'offer', sections: [asId('oysters')], offered: true, all }, counting()).offers).toBeNull();
  });

  it('does nothing about a rule that has gone', () => {
    const content = contentOf(rule('r1', 'send', burgers, ['grill']));
    const gone: readonly PlanEdit[] = [
      { kind: 'change-rule', rule: asId('gone'), stations: [bar] }, { kind: 'remove-rules', rules: [asId('gone')] }, { kind: 'reorder', rule: asId('gone'), above: null },
    ];
    for (const edit of gone) expect(applyEdit(content, edit, counting())).toEqual(content);
  });
});

describe('every edit', () => {
  it('is taken back by its inverse, and leaves the content it was given as it was', () => {
    fc.assert(fc.property(anyContent, anyEdit, (content, edit) => {
      const before = structuredClone(content);
      const after = applyEdit(content, edit, counting());
      expect(content).toEqual(before);
      expect(applyEdit(after, inverseOf(content, 'Undo'), counting())).toEqual(content);
    }), { seed: 20261201 });
  });

  it('leaves no rule without a station and no id twice', () => {
    fc.assert(fc.property(anyContent, fc.array(anyEdit, { maxLength: 6 }), (content, edits) => {
      const newId = counting();
      const after = edits.reduce((standing, edit) => applyEdit(standing, edit, newId), content);
      expect(after.rules.every((each) => each.stations.length > 0)).toBe(true);
      expect(new Set(after.rules.map((each) => each.id)).size).toBe(after.rules.length);
    }), { seed: 20261201 });
  });

  it('adding a station and taking it off again changes nothing', () => {
    fc.assert(fc.property(anyContent, (content) => {
      const edit = { kind: 'send', targets: [burgers], conditions: anyCondition, stations: [asId<StationId>('new-station')] } as const;
      const there = applyEdit(content, { ...edit, how: 'add' }, counting());
      const back = applyEdit(there, { ...edit, how: 'remove' }, counting());
      const winner = content.rules.findLast((each) => each.kind === 'send' && each.target.kind === 'section' && each.target.section === 'burgers' && each.conditions.areas.length + each.conditions.tills.length + each.conditions.orderTypes.length === 0);
      expect(back.rules.find((each) => each.id === winner?.id)).toEqual(winner);
    }), { seed: 20261201 });
  });
});
