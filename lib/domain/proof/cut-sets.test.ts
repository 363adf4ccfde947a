import { describe, expect, it } from 'vitest';
import { asId, type PrinterId } from '@/lib/domain/site/ids';
import { allWell } from '@/lib/domain/site/present';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { minimalCutSets } from './cut-sets';
import { runDrill } from './drill';
import { enumerateWays } from './enumerate-ways';
import { provePlan } from './prove';

type Tree = { readonly name: string; readonly source: string; readonly elements: Readonly<Record<string, number>>; readonly fails: (failed: ReadonlySet<string>) => boolean; readonly cuts: readonly string[]; readonly probability: number };

const all = (failed: ReadonlySet<string>, ...names: readonly string[]): boolean => names.every((name) => failed.has(name));

/** Fault trees with published minimal cut sets and exact probabilities. */
const trees: readonly Tree[] = [
  {
    name: 'theatre supply', source: 'OpenFTA example, as asserted in the SCRAM tests', elements: { Mains: 0.03, Gen: 0.02, Relay: 0.05 },
    fails: (failed) => failed.has('Mains') && (failed.has('Gen') || failed.has('Relay')), cuts: ['Mains Gen', 'Mains Relay'], probability: 0.00207,
  },
  {
    name: 'two trains', source: 'SCRAM tests', elements: { V1: 0.5, P1: 0.7, V2: 0.5, P2: 0.7 },
    fails: (failed) => (failed.has('V1') || failed.has('P1')) && (failed.has('V2') || failed.has('P2')), cuts: ['V1 V2', 'V1 P2', 'P1 V2', 'P1 P2'], probability: 0.7225,
  },
  {
    name: 'pressure tank', source: 'NUREG-0492 chapter VIII, from memory; the probability is enumerated', elements: { T: 5e-6, K2: 3e-5, S: 1e-4, S1: 3e-5, K1: 3e-5, R: 1e-4 },
    fails: (failed) => failed.has('T') || failed.has('K2') || (failed.has('S') && (failed.has('S1') || failed.has('K1') || failed.has('R'))), cuts: ['T', 'K2', 'S S1', 'S K1', 'S R'], probability: 3.5016e-5,
  },
  {
    name: 'two of three', source: 'arithmetic: 3 q^2 (1 - q) + q^3', elements: { A: 0.1, B: 0.1, C: 0.1 },
    fails: (failed) => [...failed].length >= 2, cuts: ['A B', 'A C', 'B C'], probability: 0.028,
  },
  {
    name: 'a kitchen behind one switch', source: 'own model, enumerated', elements: { switch: 1e-3, server: 5e-3, P1: 0.02, P2: 0.02 },
    fails: (failed) => failed.has('switch') || failed.has('server') || all(failed, 'P1', 'P2'), cuts: ['switch', 'server', 'P1 P2'], probability: 0.006392602,
  },
];

/** The exact probability by trying all 2^n states. */
const enumerated = ({ elements, fails }: Tree): number => {
  const names = Object.keys(elements);
  let sum = 0;
  for (let state = 0; state < 2 ** names.length; state += 1) {
    const failed = new Set(names.filter((_, index) => (state >> index) & 1));
    if (!fails(failed)) continue;
    sum += names.reduce((product, name) => product * (failed.has(name) ? elements[name]! : 1 - elements[name]!), 1);
  }
  return sum;
};

describe('minimal cut sets', () => {
  it.each(trees)('of the $name ($source)', (tree) => {
    const cuts = minimalCutSets(Object.keys(tree.elements), tree.fails, 3);
    expect(new Set(cuts.map((cut) => cut.toSorted().join(' ')))).toEqual(new Set(tree.cuts.map((cut) => cut.split(' ').toSorted().join(' '))));
    expect(enumerated(tree)).toBeCloseTo(tree.probability, 8);
  });

  it('of three motors (OpenFTA example, SCRAM tests): one of order one, three of order two, eight of order four', () => {
    const fails = (failed: ReadonlySet<string>): boolean => {
      const relay = (failed.has('KT1inc') || failed.has('T2inc')) && (failed.has('KT2inc') || failed.has('T3inc')) && (failed.has('KT3inc') || failed.has('T4inc'));
      return failed.has('K5') || (failed.has('T2') && (failed.has('S1') || failed.has('K1') || failed.has('T1inc') || relay));
    };
    const cuts = minimalCutSets(['K5', 'S1', 'T2', 'K1', 'T1inc', 'KT1inc', 'T2inc', 'KT2inc', 'T3inc', 'KT3inc', 'T4inc'], fails, 4);
    expect([1, 2, 3, 4].map((order) => cuts.filter((cut) => cut.length === order).length)).toEqual([1, 3, 0, 8]);
  });
});

describe('the drill beside cut sets', () => {
  const site = aSite({
    areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
    tills: [aTill('till1', 'room', '10.20.30.61')],
    printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('SAUCE1') }), aPrinter('SAUCE1', '10.20.30.203', { backup: asId('GRILL1') }), aPrinter('BAR1', '10.20.30.205')],
    stations: [aStation('grill', ['GRILL1']), aStation('sauce', ['SAUCE1'], { position: 1 }), aStation('bar', ['BAR1'], { position: 2 })],
    menu: { sections: [aSection('meat'), aSection('fish'), aSection('drinks')], items: [anItem('steak', 'meat'), anItem('hake', 'fish'), anItem('beer', 'drinks')] },
  });
  const plan = aPlan(['meat grill', 'fish sauce', 'drinks bar'].map((words, index) => {
    const [section, station] = words.split(' ') as [string, string];
    return aRule(`r${index}`, 'send', { kind: 'section', section: asId(section) }, [station]);
  }));

  it('finds the same single points and minimal pairs of printers', () => {
    const drill = runDrill(site, plan, enumerateWays(site, plan));
    const loses = (down: ReadonlySet<PrinterId>): boolean => provePlan(site, plan, { ...allWell, downPrinters: [...down] }).judgements.some((one) => one.outcome !== 'prints');
    const cuts = minimalCutSets(site.printers.map((printer) => printer.id), loses, 2);
    const single = drill.single.flatMap(({ fault }) => (fault.kind === 'printer' ? [[fault.printer]] : []));
    const pairs = drill.pairs.flatMap(({ fault }) => (fault.kind === 'printers' ? [[...fault.printers]] : []));
    expect([...single, ...pairs]).toEqual(cuts);
    expect(cuts).toEqual([['BAR1'], ['GRILL1', 'SAUCE1']]);
  });
});
