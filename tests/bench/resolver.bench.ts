import { Engine } from 'json-rules-engine';
import { LogicEngine } from 'json-logic-engine';
import jsonLogic from 'json-logic-js';
import { compilePlan, type Context } from '@/lib/domain/routing/compile-plan';
import { findSendWinner } from '@/lib/domain/routing/find-winner';
import { narrownessOf } from '@/lib/domain/routing/narrowness';
import { routeLine } from '@/lib/domain/routing/route-line';
import { prepareRouting } from '@/lib/domain/routing/routing';
import { asId, type ItemId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Rule, Target } from '@/lib/domain/site/plan';
import { allWell } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { chance } from '@/tests/fixtures/chance';
import type { Figure } from './figure';

type Line = { readonly item: ItemId; readonly section: string; readonly context: Context };

const count = { sections: 40, items: 400, stations: 12, tills: 24, areas: 6, lines: 10_000 };

const numbered = <Made>(many: number, make: (index: number) => Made): readonly Made[] => Array.from({ length: many }, (_, index) => make(index));

const makeSite = (): Site => aSite({
  areas: numbered(count.areas, (index) => ({ id: asId(`area${index}`), name: `Area ${index}`, version: 1 })),
  tills: numbered(count.tills, (index) => aTill(`till${index}`, `area${index % count.areas}`, `10.20.30.${20 + index}`)),
  printers: numbered(count.stations, (index) => aPrinter(`PRINTER${index}`, `10.20.30.${200 + index}`)),
  stations: numbered(count.stations, (index) => aStation(`station${index}`, [`PRINTER${index}`], { position: index })),
  menu: {
    sections: numbered(count.sections, (index) => aSection(`section${index}`)),
    items: numbered(count.items, (index) => anItem(`item${index}`, `section${index % count.sections}`)),
  },
});

const makeRules = (many: number): readonly Rule[] => {
  const random = chance(7 + many);
  const some = (prefix: string, of: number): string[] => [`${prefix}${random.below(of)}`, `${prefix}${random.below(of)}`];
  const base = [
    aRule('all', 'send', { kind: 'everything' }, ['station0']),
    ...numbered(count.sections, (index) => aRule(`base${index}`, 'send', { kind: 'section', section: asId(`section${index}`) }, [`station${index % count.stations}`])),
  ];
  const more = numbered(many - base.length, (index) => {
    const target: Target = random.below(3) === 0
      ? { kind: 'section', section: asId(`section${random.below(count.sections)}`) }
      : { kind: 'item', item: asId(`item${random.below(count.items)}`) };
    return aRule(`rule${index}`, 'send', target, [`station${random.below(count.stations)}`], {
      tills: random.below(2) === 0 ? some('till', count.tills).map((id) => asId(id)) : [],
      areas: random.below(2) === 0 ? some('area', count.areas).map((id) => asId(id)) : [],
      orderTypes: random.below(2) === 0 ? [orderTypes[random.below(3)]!] : [],
    });
  });
  return [...base, ...more];
};

const makeLines = (site: Site): readonly Line[] => {
  const random = chance(99);
  return numbered(count.lines, () => {
    const item = site.menu.items[random.below(site.menu.items.length)]!;
    const till = site.tills[random.below(site.tills.length)]!;
    return { item: item.id, section: item.section, context: { orderType: orderTypes[random.below(3)]!, area: till.area, till: till.id } };
  });
};

/** The same decision as a chain of conditions, narrowest first: the natural way to write it for a logic engine. */
const asChain = (rules: readonly Rule[]): unknown => {
  const ranked = rules.map((rule, position) => ({ rule, position })).toSorted((left, right) => narrownessOf(right.rule) - narrownessOf(left.rule) || right.position - left.position);
  return { if: [...ranked.flatMap(({ rule }) => [{ and: conditionsOf(rule) }, rule.stations[0]]), null] };
};

const conditionsOf = ({ target, conditions }: Rule): readonly unknown[] => [
  ...(target.kind === 'section' ? [{ '==': [{ var: 'section' }, target.section] }] : []),
  ...(target.kind === 'item' ? [{ '==': [{ var: 'item' }, target.item] }] : []),
  ...(conditions.tills.length > 0 ? [{ in: [{ var: 'till' }, conditions.tills] }] : []),
  ...(conditions.areas.length > 0 ? [{ in: [{ var: 'area' }, conditions.areas] }] : []),
  ...(conditions.orderTypes.length > 0 ? [{ in: [{ var: 'orderType' }, conditions.orderTypes] }] : []),
  true,
];

const asEngine = (rules: readonly Rule[]): Engine => {
  const engine = new Engine();
  rules.forEach((rule, position) => {
    const { target, conditions } = rule;
    const all = [
      ...(target.kind === 'section' ? [{ fact: 'section', operator: 'equal', value: target.section as string }] : []),
      ...(target.kind === 'item' ? [{ fact: 'item', operator: 'equal', value: target.item as string }] : []),
      ...(conditions.tills.length > 0 ? [{ fact: 'till', operator: 'in', value: [...conditions.tills] as string[] }] : []),
      ...(conditions.areas.length > 0 ? [{ fact: 'area', operator: 'in', value: [...conditions.areas] as string[] }] : []),
      ...(conditions.orderTypes.length > 0 ? [{ fact: 'orderType', operator: 'in', value: [...conditions.orderTypes] as string[] }] : []),
    ];
    const anything = { fact: 'item', operator: 'notEqual', value: '' };
    engine.addRule({
      conditions: { all: all.length > 0 ? all : [anything] },
      event: { type: 'send', params: { rank: narrownessOf(rule) * 10_000 + position, station: rule.stations[0] } },
      priority: 1,
    });
  });
  return engine;
};

const factsOf = ({ item, section, context }: Line) => ({ item, section, till: context.till, area: context.area, orderType: context.orderType });

/** Lines a second, best of several passes: what the machine can do, not what else ran on it. */
const rateOf = async (lines: readonly Line[], passes: number, resolve: (line: Line) => unknown): Promise<number> => {
  let best = Infinity;
  for (let pass = 0; pass < passes; pass += 1) {
    const start = performance.now();
    for (const line of lines) {
      const answer = resolve(line);
      if (answer instanceof Promise) await answer;
    }
    best = Math.min(best, performance.now() - start);
  }
  return Math.round((lines.length / best) * 1000);
};

const measure = async (many: number): Promise<readonly Figure[]> => {
  const site = makeSite();
  const plan = aPlan(makeRules(many));
  const lines = makeLines(site);
  const compiled = compilePlan(site, plan);
  const routing = prepareRouting(site, plan, allWell);
  const chain = asChain(plan.rules);
  const compiledChain = new LogicEngine().build(chain as never) as (data: unknown) => unknown;
  const engine = asEngine(plan.rules);
  const fewLines = lines.slice(0, Math.round(40_000 / many));

  const bare = (line: Line): unknown => findSendWinner(compiled, line.item, line.context)?.stations[0];
  const byEngine = async (line: Line): Promise<unknown> => {
    const { events } = await engine.run(factsOf(line));
    return events.toSorted((left, right) => (right.params!['rank'] as number) - (left.params!['rank'] as number))[0]?.params?.['station'];
  };
  const facts = new Map(lines.map((line) => [line, factsOf(line)]));
  let agreed = 0;
  for (const line of fewLines) {
    const answer = bare(line);
    if (compiledChain(facts.get(line)) === answer && jsonLogic.apply(chain as never, facts.get(line)) === answer && (await byEngine(line)) === answer) agreed += 1;
  }

  const rates = {
    bare: await rateOf(lines, 40, bare),
    explained: await rateOf(lines, 20, (line) => routeLine(routing, line.item, [], line.context)),
    compiledChain: await rateOf(many > 500 ? lines.slice(0, 2_000) : lines, 3, (line) => compiledChain(facts.get(line))),
    chain: await rateOf(lines.slice(0, 400), 2, (line) => jsonLogic.apply(chain as never, facts.get(line))),
    engine: await rateOf(fewLines, 1, byEngine),
  };
  const ratio = Math.round(rates.bare / rates.compiledChain);
  const at = `at ${many.toLocaleString('en')} rules`;
  return [
    { name: `same answer from all four ${at}`, value: agreed, unit: `of ${fewLines.length} lines`, goal: `= ${fewLines.length}`, holds: agreed === fewLines.length },
    { name: `resolver, bare, ${at}`, value: rates.bare, unit: 'lines/s', goal: '>= 2,000,000', holds: rates.bare >= 2_000_000 },
    { name: `resolver, with explanation, ${at}`, value: rates.explained, unit: 'lines/s', goal: '>= 300,000', holds: rates.explained >= 300_000 },
    { name: `json-logic-engine, compiled, ${at}`, value: rates.compiledChain, unit: 'lines/s', goal: 'peer', holds: true },
    { name: `json-logic-js ${at}`, value: rates.chain, unit: 'lines/s', goal: 'peer', holds: true },
    { name: `json-rules-engine ${at}`, value: rates.engine, unit: 'lines/s', goal: 'peer', holds: true },
    { name: `resolver against compiled json-logic-engine ${at}`, value: ratio, unit: 'times', goal: '>= 50', holds: ratio >= 50 },
  ];
};

const bench = async (): Promise<readonly Figure[]> => [...(await measure(200)), ...(await measure(2_000))];
export default bench;
