import { prepareDrill, printerPairs, singleFaults } from '@/lib/domain/proof/drill';
import { enumerateWays } from '@/lib/domain/proof/enumerate-ways';
import { provePlan } from '@/lib/domain/proof/prove';
import { asId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { chance } from '@/tests/fixtures/chance';
import type { Figure } from './figure';

const count = { sections: 40, items: 400, options: 80, stations: 8, printers: 10, tills: 24, areas: 6 };

const numbered = <Made>(many: number, make: (index: number) => Made): readonly Made[] => Array.from({ length: many }, (_, index) => make(index));

/** 400 items with two options each, alone or none: 1,200 combinations, times 3 order types, times 24 tills. */
const makeSite = (printers: number): Site => aSite({
  areas: numbered(count.areas, (index) => ({ id: asId(`area${index}`), name: `Area ${index}`, version: 1 })),
  tills: numbered(count.tills, (index) => aTill(`till${index}`, `area${index % count.areas}`, `10.20.30.${20 + index}`)),
  printers: numbered(printers, (index) => aPrinter(`PRINTER${index}`, `10.20.30.${200 + index}`, { backup: index % 3 === 0 ? asId(`PRINTER${(index + 1) % printers}`) : null })),
  stations: numbered(count.stations, (index) => aStation(`station${index}`, [`PRINTER${index}`], { position: index, kind: index === 0 ? 'pass' : 'prep', standIn: index % 2 === 1 ? asId(`station${(index + 1) % count.stations}`) : null })),
  menu: {
    sections: numbered(count.sections, (index) => aSection(`section${index}`)),
    items: numbered(count.items, (index) => anItem(`item${index}`, `section${index % count.sections}`, { optionGroups: [asId(`group${index % (count.options / 2)}`)] })),
    optionGroups: numbered(count.options / 2, (index) => aGroup(`group${index}`, [`option${2 * index}`, `option${2 * index + 1}`])),
    options: numbered(count.options, (index) => anOption(`option${index}`, `group${Math.floor(index / 2)}`)),
  },
});

const makePlan = (rules: number): Plan => {
  const random = chance(31 + rules);
  const base = [
    aRule('pass', 'copy', { kind: 'everything' }, ['station0']),
    ...numbered(count.sections, (index) => aRule(`base${index}`, 'send', { kind: 'section', section: asId(`section${index}`) }, [`station${1 + (index % (count.stations - 1))}`])),
    ...numbered(count.options / 4, (index) => aRule(`split${index}`, 'split', { kind: 'option', option: asId(`option${4 * index}`) }, [`station${1 + random.below(count.stations - 1)}`])),
  ];
  return aPlan([...base, ...numbered(rules - base.length, (index) => aRule(
    `rule${index}`, 'send',
    random.below(3) === 0 ? { kind: 'section', section: asId(`section${random.below(count.sections)}`) } : { kind: 'item', item: asId(`item${random.below(count.items)}`) },
    [`station${1 + random.below(count.stations - 1)}`],
    {
      tills: random.below(2) === 0 ? [asId(`till${random.below(count.tills)}`), asId(`till${random.below(count.tills)}`)] : [],
      areas: random.below(2) === 0 ? [asId(`area${random.below(count.areas)}`)] : [],
      orderTypes: random.below(2) === 0 ? [orderTypes[random.below(3)]!] : [],
    },
  ))]);
};

/** Milliseconds, the best of several runs. */
const bestMs = (runs: number, work: () => unknown): number => {
  let best = Infinity;
  for (let run = 0; run < runs; run += 1) {
    const start = performance.now();
    work();
    best = Math.min(best, performance.now() - start);
  }
  return best;
};

const tenth = (value: number): number => Math.round(value * 10) / 10;

const bench = async (): Promise<readonly Figure[]> => {
  const site = makeSite(count.printers);
  const plan = makePlan(200);
  const proofMs = bestMs(15, () => provePlan(site, plan));
  const many = makePlan(2_000);
  const manyMs = bestMs(15, () => provePlan(site, many));
  const { total } = enumerateWays(site, plan);

  const faults = singleFaults(site).slice(0, 25);
  const drillMs = bestMs(8, () => {
    const drill = prepareDrill(site, plan, enumerateWays(site, plan));
    return faults.map(drill);
  });
  const wide = makeSite(25);
  const pairs = printerPairs(wide);
  const wideMs = bestMs(5, () => provePlan(wide, plan));
  const pairsMs = bestMs(5, () => {
    const drill = prepareDrill(wide, plan, enumerateWays(wide, plan));
    return pairs.map(drill);
  });
  return [
    { name: 'ways to order in the measured proof', value: total, unit: 'ways', goal: '= 86,400', holds: total === 86_400 },
    { name: 'proof of 86,400 ways, all findings, 200 rules', value: tenth(proofMs), unit: 'ms', goal: '<= 50', holds: proofMs <= 50 },
    { name: 'the same with 2,000 rules', value: tenth(manyMs / proofMs), unit: 'times 200 rules', goal: '<= 2', holds: manyMs / proofMs <= 2 },
    { name: `drill of ${faults.length} single faults`, value: tenth(drillMs / proofMs), unit: 'times one proof', goal: '<= 10', holds: drillMs / proofMs <= 10 },
    { name: `drill of all ${pairs.length} pairs of printers`, value: tenth(pairsMs / wideMs), unit: 'times one proof', goal: '<= 40', holds: pairsMs / wideMs <= 40 },
  ];
};
export default bench;
