import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { OptionId } from '@/lib/domain/site/ids';
import type { Plan, Rule } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { generated, seeded } from '@/tests/fixtures/generated-site';
import { naiveLine } from '@/tests/fixtures/naive-routing';
import { aRule } from '@/tests/fixtures/build-site';
import type { Context } from './compile-plan';
import { narrownessOf } from './narrowness';
import { routeLine, type LineRoute } from './route-line';
import { prepareRouting, reachesOf } from './routing';

const contextsOf = (site: Site): readonly Context[] =>
  site.tills.flatMap((till) => till.orderTypes.map((orderType) => ({ orderType, area: till.area, till: till.id })));

type Tried = { readonly item: Site['menu']['items'][number]; readonly options: readonly OptionId[]; readonly context: Context };

/** Every item with no option and with all its options, in every context. */
const triedIn = (site: Site): readonly Tried[] =>
  site.menu.items.flatMap((item) => {
    const all = site.menu.options.filter((option) => item.optionGroups.includes(option.group)).map((option) => option.id);
    return contextsOf(site).flatMap((context) => [[], all].map((options) => ({ item, options, context })));
  });

const routesOf = (site: Site, plan: Plan, present: Present): readonly LineRoute[] => {
  const routing = prepareRouting(site, plan, present);
  return triedIn(site).map(({ item, options, context }) => routeLine(routing, item.id, options, context));
};

const printed = (routes: readonly { reached: unknown; printer: unknown }[]): unknown =>
  routes.map(({ reached, printer }) => ({ reached, printer }));

describe('routing a line', () => {
  it('agrees with a naive reading of the steps on everything', () => {
    fc.assert(fc.property(generated, ({ site, plan, present }) => {
      const reaches = reachesOf(site, present);
      const routing = prepareRouting(site, plan, present);
      for (const { item, options, context } of triedIn(site)) {
        const fast = routeLine(routing, item.id, options, context);
        const naive = naiveLine(site, plan, present, reaches, item.id, options, context);
        expect({
          cooks: printed(fast.cook.routes),
          splits: fast.splits.map((split) => ({ option: split.option, stations: printed(split.routes), withDish: split.withDish })),
          copies: printed(fast.copies),
          outcome: fast.outcome,
        }).toEqual({
          cooks: printed(naive.cooks),
          splits: naive.splits.map((split) => ({ option: split.option, stations: printed(split.stations), withDish: split.withDish })),
          copies: printed(naive.copies),
          outcome: naive.outcome,
        });
      }
    }), seeded);
  });

  it('gives the same record for the same input, so that an explanation can be replayed', () => {
    fc.assert(fc.property(generated, ({ site, plan, present }) => {
      expect(routesOf(site, plan, present)).toEqual(routesOf(structuredClone(site), structuredClone(plan), structuredClone(present)));
    }), { ...seeded, numRuns: 100 });
  });

  it('lets a rule narrower than all others of its kind change only what it covers', () => {
    fc.assert(fc.property(generated, fc.nat(), ({ site, plan, present }, chance) => {
      const item = site.menu.items[chance % site.menu.items.length]!;
      const till = site.tills[chance % site.tills.length]!;
      const station = site.stations[chance % site.stations.length]!;
      const added = aRule('added', 'send', { kind: 'item', item: item.id }, [station.id], { tills: [till.id], areas: [till.area], orderTypes: [till.orderTypes[0]!] });
      const narrowest = plan.rules.filter((rule) => rule.kind === 'send').every((rule) => narrownessOf(rule) < narrownessOf(added));
      fc.pre(narrowest);
      const before = routesOf(site, plan, present);
      const after = routesOf(site, { ...plan, rules: [added, ...plan.rules] }, present);
      before.forEach((route, index) => {
        const covered = route.item === item.id && route.context.till === till.id && route.context.orderType === till.orderTypes[0];
        if (covered) expect(after[index]!.cook.decision.winner).toEqual(added);
        else expect({ ...after[index], cook: { ...after[index]!.cook, decision: null } }).toEqual({ ...route, cook: { ...route.cook, decision: null } });
      });
    }), seeded);
  });

  it('does not care in which order rules stand that do not tie', () => {
    const untied = (rules: readonly Rule[]): readonly Rule[] => {
      const seen = new Set<string>();
      return rules.filter((rule) => {
        const key = `${rule.kind} ${narrownessOf(rule)} ${rule.kind === 'copy' ? rule.id : ''}`;
        return !seen.has(key) && seen.add(key) && rule.kind !== 'copy';
      });
    };
    fc.assert(fc.property(generated, ({ site, plan, present }) => {
      const rules = untied(plan.rules);
      const strip = (routes: readonly LineRoute[]) => routes.map((route) => ({ cook: printed(route.cook.routes), splits: route.splits.map((split) => printed(split.routes)), outcome: route.outcome }));
      expect(strip(routesOf(site, { ...plan, rules: rules.toReversed() }, present))).toEqual(strip(routesOf(site, { ...plan, rules }, present)));
    }), seeded);
  });

  it('never lets a copy or a lost copy change the outcome', () => {
    fc.assert(fc.property(generated, ({ site, plan, present }) => {
      const outcomes = (rules: readonly Rule[]) => routesOf(site, { ...plan, rules }, present).map((route) => route.outcome);
      expect(outcomes(plan.rules.filter((rule) => rule.kind !== 'copy'))).toEqual(outcomes(plan.rules));
    }), { ...seeded, numRuns: 200 });
  });
});
