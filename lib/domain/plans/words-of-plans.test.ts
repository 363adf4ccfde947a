import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asId } from '../site/ids';
import type { Rule } from '../site/plan';
import { anyCondition } from '../site/plan';
import { applyEdit } from './apply-edit';
import { describeEdit } from './describe-edit';
import { differences } from './differences';
import type { PlanEdit } from './edit';
import { anyContent, anyEdit } from '@/tests/fixtures/generated-plans';
import { burgers, contentOf, counting, oysters, rule, sideSalad, smallSite, steakRoll } from '@/tests/fixtures/small-plan-site';

const content = contentOf(rule('r1', 'send', burgers, ['grill']), rule('r2', 'copy', { kind: 'everything' }, ['pass']));

const edits: readonly (readonly [string, PlanEdit])[] = [
  ['Oysters to Larder', { kind: 'hang', cards: [{ target: oysters, rule: null, from: null }], to: asId('larder') }],
  ['Burgers off Grill', { kind: 'hang', cards: [{ target: burgers, rule: asId('r1'), from: asId('grill') }], to: null }],
  ['Burgers and Oysters to Grill and Bar', { kind: 'send', targets: [burgers, oysters], conditions: anyCondition, how: 'replace', stations: [asId('grill'), asId('bar')] }],
  ['Steak roll also to Larder (take away)', { kind: 'send', targets: [steakRoll], conditions: { ...anyCondition, orderTypes: ['take-away'] }, how: 'add', stations: [asId('larder')] }],
  ['Side salad splits to Larder', { kind: 'split', target: sideSalad, conditions: anyCondition, stations: [asId('larder')], keep: false }],
  ['Copy of everything to Bar', { kind: 'copy', targets: [{ kind: 'everything' }], conditions: anyCondition, how: 'add', stations: [asId('bar')] }],
  ['Burgers to Bar', { kind: 'change-rule', rule: asId('r1'), stations: [asId('bar')] }],
  ['No longer: Copy of everything to Pass', { kind: 'remove-rules', rules: [asId('r2')] }],
  ['Oysters not offered', { kind: 'offer', sections: [asId('oysters')], offered: false, all: [] }],
];

describe('an edit in words', () => {
  it.each(edits)('%s', (words, edit) => {
    expect(describeEdit(edit, smallSite, content)).toBe(words);
  });
});

describe('what changed between two contents', () => {
  const wordsAfter = (...steps: readonly PlanEdit[]): readonly string[] => {
    const newId = counting();
    return differences(content, steps.reduce((standing, edit) => applyEdit(standing, edit, newId), content), smallSite).map((difference) => difference.words);
  };

  it('names what moved with where it was, what is new, what has gone and what is offered', () => {
    expect(wordsAfter(
      { kind: 'send', targets: [burgers], conditions: anyCondition, how: 'replace', stations: [asId('bar')] },
      { kind: 'send', targets: [oysters], conditions: anyCondition, how: 'replace', stations: [asId('larder')] },
      { kind: 'remove-rules', rules: [asId('r2')] },
      { kind: 'offer', sections: [asId('vouchers')], offered: false, all: smallSite.menu.sections.map((section) => section.id) },
    )).toEqual(['Burgers from Grill to Bar', 'No longer: Copy of everything to Pass', 'Oysters to Larder', 'Vouchers not offered']);
  });

  it('counts a change and its opposite as none', () => {
    expect(wordsAfter(
      { kind: 'hang', cards: [{ target: burgers, rule: asId('r1'), from: asId('grill') }], to: null },
      { kind: 'send', targets: [burgers], conditions: anyCondition, how: 'replace', stations: [asId('grill')] },
    )).toEqual([]);
  });

  it('tells an order that matters from one that does not', () => {
    const terrace = rule('t', 'send', burgers, ['bar'], { areas: [asId('terrace')] });
    const main = rule('m', 'send', burgers, ['larder'], { areas: [asId('main')] });
    const fish = rule('o', 'send', oysters, ['larder']);
    const words = (before: readonly Rule[], after: readonly Rule[]) => differences(contentOf(...before), contentOf(...after), smallSite).map((each) => each.words);
    expect(words([terrace, main], [main, terrace])).toEqual(['Rules in another order']);
    expect(words([terrace, fish], [fish, terrace])).toEqual([]);
  });

  it('finds none between a content and itself, and says something of every edit that made one', () => {
    fc.assert(fc.property(anyContent, anyEdit, (before, edit) => {
      expect(differences(before, before, smallSite)).toEqual([]);
      expect(describeEdit(edit, smallSite, before)).not.toBe('');
      for (const difference of differences(before, applyEdit(before, edit, counting()), smallSite)) expect(difference.words).not.toBe('');
    }), { seed: 20261201 });
  });
});
