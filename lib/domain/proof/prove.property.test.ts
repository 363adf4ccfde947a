import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { OptionId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell, type Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { reachesOf } from '@/lib/domain/routing/routing';
import { generated, seeded } from '@/tests/fixtures/generated-site';
import { naiveLine, type NaiveLine } from '@/tests/fixtures/naive-routing';
import { prepareDrill, presentUnder, printerPairs, singleFaults } from './drill';
import { enumerateWays } from './enumerate-ways';
import { provePlan } from './prove';
import type { Way } from './way';

/** Every way to order, written out from its definition without folding anything. */
const naiveWays = (site: Site, plan: Plan): readonly Way[] => {
  const splitting = (option: OptionId): boolean => plan.rules.some((rule) => rule.kind === 'split' && 'option' in rule.target && rule.target.option === option);
  return site.menu.items
    .filter((item) => !item.noTicket && (plan.offers === null || plan.offers.includes(item.section)))
    .flatMap((item) => {
      const options = item.optionGroups.flatMap((id) => site.menu.options.filter((option) => option.group === id));
      const sets: OptionId[][] = [[], ...options.map((option) => [option.id])];
      for (const [index, first] of options.entries()) {
        for (const second of options.slice(index + 1)) {
          const group = site.menu.optionGroups.find((one) => one.id === first.group)!;
          const together = first.group !== second.group || group.max >= 2;
          if (together && splitting(first.id) && splitting(second.id)) sets.push([first.id, second.id]);
        }
      }
      return sets.flatMap((set) => site.tills.flatMap((till) => till.orderTypes.map((orderType): Way => ({ item: item.id, options: set, orderType, till: till.id }))));
    });
};

const naiveOutcomes = (site: Site, plan: Plan, present: Present): ReadonlyMap<string, NaiveLine> => {
  const reaches = reachesOf(site, present);
  return new Map(naiveWays(site, plan).map((way) => {
    const till = site.tills.find((one) => one.id === way.till)!;
    return [JSON.stringify(way), naiveLine(site, plan, present, reaches, way.item, way.options, { orderType: way.orderType, area: till.area, till: till.id })];
  }));
};

const seedsFor = (numRuns: number) => ({ ...seeded, numRuns });

describe('proving a plan', () => {
  it('finds the same number of lost, part lost and printing ways as trying each one by hand', () => {
    fc.assert(fc.property(generated, fc.boolean(), ({ site, plan, present }, now) => {
      const state = now ? present : allWell;
      const proof = provePlan(site, plan, state);
      const byHand = [...naiveOutcomes(site, plan, state).values()];
      const count = (outcome: string): number => proof.judgements.filter((one) => one.outcome === outcome).reduce((sum, one) => sum + one.of.ways, 0);
      for (const outcome of ['prints', 'part lost', 'lost'] as const) {
        expect(count(outcome)).toBe(byHand.filter((line) => line.outcome === outcome).length);
      }
      expect(proof.ways.total).toBe(byHand.length);
    }), seedsFor(300));
  });

  it('gives for every loss a concrete order that a naive reading loses too', () => {
    fc.assert(fc.property(generated, ({ site, plan, present }) => {
      const naive = naiveOutcomes(site, plan, present);
      for (const judgement of provePlan(site, plan, present).judgements) {
        expect(naive.get(JSON.stringify(judgement.of.first))?.outcome).toBe(judgement.outcome);
      }
    }), seedsFor(300));
  });

  it('has a stop finding exactly when something is lost', () => {
    fc.assert(fc.property(generated, ({ site, plan }) => {
      const proof = provePlan(site, plan);
      expect(proof.findings.some((finding) => finding.severity === 'stop')).toBe(proof.judgements.some((one) => one.outcome !== 'prints'));
    }), seedsFor(300));
  });

  it('calls a rule unused exactly when no way is decided by it', () => {
    fc.assert(fc.property(generated, ({ site, plan }) => {
      const { uses } = enumerateWays(site, plan);
      const reaches = reachesOf(site, allWell);
      for (const use of uses.filter((one) => one.rule.kind === 'send')) {
        const without = { ...plan, rules: plan.rules.filter((rule) => rule !== use.rule) };
        if (use.won > 0) continue;
        for (const way of naiveWays(site, plan)) {
          const context = { orderType: way.orderType, area: site.tills.find((one) => one.id === way.till)!.area, till: way.till };
          expect(naiveLine(site, without, allWell, reaches, way.item, [], context).cooks).toEqual(naiveLine(site, plan, allWell, reaches, way.item, [], context).cooks);
        }
      }
    }), seedsFor(60));
  });
});

describe('the fault drill', () => {
  it('loses under each fault what trying every way by hand loses beyond the unbroken plan', () => {
    fc.assert(fc.property(generated, ({ site, plan }) => {
      const drill = prepareDrill(site, plan, enumerateWays(site, plan));
      const whole = naiveOutcomes(site, plan, allWell);
      for (const fault of [...singleFaults(site), ...printerPairs(site)]) {
        const present = presentUnder(site, fault);
        const lost = [...naiveOutcomes(site, plan, present)].filter(([key, line]) => {
          const before = whole.get(key)!.outcome;
          const way = JSON.parse(key) as Way;
          return !present.offTills.includes(way.till) && before !== 'lost' && line.outcome !== 'prints' && line.outcome !== before;
        });
        expect(drill(fault).lostWays).toBe(lost.length);
      }
    }), seedsFor(60));
  });
});
