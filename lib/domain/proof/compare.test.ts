import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { aPlan, anItem, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { generated, seeded } from '@/tests/fixtures/generated-site';
import { comparePlans } from './compare';
import { enumerateWays } from './enumerate-ways';
import { groupChanges } from './group-changes';
import { prepareDrill, printerPairs, singleFaults } from './drill';
import { proposeFor } from './propose';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }, { id: asId('terrace'), name: 'Terrace', version: 1 }],
  tills: [aTill('till1', 'room', '10.20.30.61', { name: 'Till 1' }), aTill('till2', 'terrace', '10.20.30.62', { name: 'Till 2' })],
  printers: [aPrinter('PASTRY1', '10.20.30.201'), aPrinter('LARDER1', '10.20.30.202')],
  stations: [aStation('pastry', ['PASTRY1'], { name: 'Pastry' }), aStation('larder', ['LARDER1'], { name: 'Larder', position: 1 })],
  menu: {
    sections: [aSection('desserts', { name: 'Desserts' }), aSection('salads', { name: 'Salads' })],
    items: [anItem('tart', 'desserts', { name: 'Lemon tart' }), anItem('ice', 'desserts', { name: 'Ices' }), anItem('tomato', 'salads', { name: 'Tomato salad' })],
  },
});
const desserts = aRule('r1', 'send', { kind: 'section', section: asId('desserts') }, ['pastry']);
const salads = aRule('r2', 'send', { kind: 'section', section: asId('salads') }, ['larder']);
const base = aPlan([desserts, salads]);
const wordsOf = (rules: readonly (typeof desserts)[], offers: readonly string[] | null = null): readonly string[] => {
  const after = aPlan(rules, { offers: offers === null ? null : offers.map((id) => asId(id)) });
  return groupChanges(site, comparePlans(site, base, after).changes).map((group) => `${group.kind}: ${group.words}`);
};

describe('comparing two plans', () => {
  it.each([
    { name: 'a whole section', after: [{ ...desserts, stations: [asId<never>('larder')] }, salads], words: ['moved: all Desserts: Pastry to Larder'] },
    {
      name: 'a section from one area', after: [desserts, salads, aRule('r3', 'send', { kind: 'section', section: asId('desserts') }, ['larder'], { areas: [asId('terrace')] })],
      words: ['moved: all Desserts from Terrace: Pastry to Larder'],
    },
    { name: 'one item', after: [desserts, salads, aRule('r3', 'send', { kind: 'item', item: asId('tart') }, ['larder'])], words: ['moved: Lemon tart: Pastry to Larder'] },
    {
      name: 'one order type', after: [desserts, salads, aRule('r3', 'send', { kind: 'section', section: asId('desserts') }, ['larder'], { orderTypes: ['take-away'] })],
      words: ['moved: all Desserts to take away: Pastry to Larder'],
    },
    { name: 'a section that lost its rule', after: [salads], words: ['newly-lost: all Desserts: Pastry to nowhere'] },
    { name: 'nothing', after: [salads, desserts], words: [] },
  ])('describes $name as shortly as it can', ({ after, words }) => {
    expect(wordsOf(after)).toEqual(words);
  });

  it('counts a section that is no longer offered as lost', () => {
    expect(wordsOf([desserts, salads], ['salads'])).toEqual(['newly-lost: all Desserts: Pastry to nowhere']);
  });

  it('finds nothing between a plan and itself, and the mirror image the other way round', () => {
    fc.assert(fc.property(generated, fc.nat(), ({ site: any, plan }, cut) => {
      const less = { ...plan, rules: plan.rules.filter((_, index) => index !== cut % Math.max(1, plan.rules.length)) };
      expect(comparePlans(any, plan, plan).changes).toEqual([]);
      const there = comparePlans(any, plan, less).changes;
      const back = comparePlans(any, less, plan).changes;
      expect(back.map((change) => [change.item, change.after, change.before])).toEqual(there.map((change) => [change.item, change.before, change.after]));
    }), { ...seeded, numRuns: 200 });
  });

  it('lets each group stand for exactly its changes', () => {
    fc.assert(fc.property(generated, ({ site: any, plan }) => {
      const { changes } = comparePlans(any, plan, { ...plan, rules: plan.rules.slice(1) });
      const groups = groupChanges(any, changes);
      expect(new Set(groups.flatMap((group) => group.items))).toEqual(new Set(changes.map((change) => change.item)));
      expect(groups.length).toBeLessThanOrEqual(changes.length);
    }), { ...seeded, numRuns: 200 });
  });
});

describe('proposing a backup or a stand-in', () => {
  it('never proposes what would leave as much lost as before', () => {
    fc.assert(fc.property(generated, ({ site: any, plan }) => {
      const ways = enumerateWays(any, plan);
      for (const fault of singleFaults(any)) {
        const result = prepareDrill(any, plan, ways)(fault);
        const proposal = proposeFor(any, plan, ways, result);
        if (proposal !== null) expect(proposal.leavesLost).toBeLessThan(result.lostWays);
      }
    }), { ...seeded, numRuns: 60 });
  });

  it('takes the printer that saves most, and says when both hang on one plug', () => {
    const strip = { id: asId<never>('strip'), name: 'Power strip left', kind: 'power-strip' as const };
    const both = { ...site, sharedPoints: [strip], printers: site.printers.map((printer) => ({ ...printer, sharedPoints: [strip.id] })) };
    const ways = enumerateWays(both, base);
    const proposal = proposeFor(both, base, ways, prepareDrill(both, base, ways)({ kind: 'printer', printer: asId('PASTRY1') }));
    expect(proposal).toEqual({
      fix: { kind: 'set-backup', printer: 'PASTRY1', backup: 'LARDER1', label: 'Let LARDER1 back it up' },
      leavesLost: 0,
      warning: 'Both hang on Power strip left: when that is off, both are.',
    });
  });

  it('has each pair of printers once', () => {
    expect(printerPairs({ ...site, printers: [...site.printers, aPrinter('BAR1', '10.20.30.205')] })).toHaveLength(3);
  });
});
