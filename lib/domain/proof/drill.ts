import { compilePlan } from '@/lib/domain/routing/compile-plan';
import { reachesOf, routingUnder } from '@/lib/domain/routing/routing';
import type { ItemId, PrinterId, SharedPointId, StationId, TillId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import { allWell, type Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { judgeWith } from './judge';
import type { Ways } from './way';

/** One thing that can break, or two printers at once. */
export type Fault =
  | { readonly kind: 'printer'; readonly printer: PrinterId }
  | { readonly kind: 'station'; readonly station: StationId }
  | { readonly kind: 'till'; readonly till: TillId }
  | { readonly kind: 'shared-point'; readonly sharedPoint: SharedPointId }
  | { readonly kind: 'printers'; readonly printers: readonly [PrinterId, PrinterId] };

/** What one fault takes with it, counted against the unbroken plan. */
export type DrillResult = {
  readonly fault: Fault;
  readonly lostItems: readonly ItemId[];
  /** Items of which only a part is lost. */
  readonly partLostItems: readonly ItemId[];
  readonly tills: readonly TillId[];
  readonly lostWays: number;
  /** Numbers of the classes of ways that are lost or part lost by it. */
  readonly classes: ReadonlySet<number>;
};

/** The state of the kitchen under a fault; a shared point takes its printers and tills with it. */
export const presentUnder = (site: Site, fault: Fault): Present => {
  switch (fault.kind) {
    case 'printer': return { ...allWell, downPrinters: [fault.printer] };
    case 'station': return { ...allWell, closedStations: [fault.station] };
    case 'till': return { ...allWell, offTills: [fault.till] };
    case 'printers': return { ...allWell, downPrinters: fault.printers };
    case 'shared-point': return {
      ...allWell,
      downPrinters: site.printers.filter((printer) => printer.sharedPoints.includes(fault.sharedPoint)).map((printer) => printer.id),
      offTills: site.tills.filter((till) => till.sharedPoints.includes(fault.sharedPoint)).map((till) => till.id),
    };
  }
};

export const singleFaults = (site: Site): readonly Fault[] => [
  ...site.printers.map((printer): Fault => ({ kind: 'printer', printer: printer.id })),
  ...site.stations.map((station): Fault => ({ kind: 'station', station: station.id })),
  ...site.tills.map((till): Fault => ({ kind: 'till', till: till.id })),
  ...site.sharedPoints.map((point): Fault => ({ kind: 'shared-point', sharedPoint: point.id })),
];

export const printerPairs = (site: Site): readonly Fault[] =>
  site.printers.flatMap((first, index) =>
    site.printers.slice(index + 1).map((second): Fault => ({ kind: 'printers', printers: [first.id, second.id] })));

/**
 * Prepares a drill: the ways are tried once, then each fault only judges their classes again.
 * Losses are those that the unbroken plan does not have; an off till's own lines are not counted.
 */
export const prepareDrill = (site: Site, plan: PlanContent, ways: Ways) => {
  const compiled = compilePlan(site, plan);
  const standingReach = reachesOf(site, allWell);
  const judgeUnder = (present: Present) =>
    judgeWith(routingUnder(site, compiled, present, present.offTills.length === 0 ? standingReach : reachesOf(site, present)));
  const whole = judgeUnder(allWell);
  const unbroken = ways.classes.map((one) => whole.outcomeOf(one));

  return (fault: Fault): DrillResult => {
    const present = presentUnder(site, fault);
    const off = new Set(present.offTills);
    const { outcomeOf } = judgeUnder(present);
    const lost = new Set<ItemId>();
    const part = new Set<ItemId>();
    const tills = new Set<TillId>();
    const classes = new Set<number>();
    let lostWays = 0;
    ways.classes.forEach((one, index) => {
      const before = unbroken[index];
      if (before === 'lost' || off.has(one.till)) return;
      const outcome = outcomeOf(one);
      if (outcome === 'prints' || outcome === before) return;
      for (const item of one.items) (outcome === 'lost' ? lost : part).add(item);
      tills.add(one.till);
      classes.add(one.number);
      lostWays += one.ways;
    });
    return {
      fault,
      lostItems: [...lost],
      partLostItems: [...part].filter((item) => !lost.has(item)),
      tills: [...tills],
      lostWays,
      classes,
    };
  };
};

/** A pair of printers that loses what neither loses alone: a minimal cut of order two. */
export type PairResult = DrillResult & { readonly beyond: number };

export type Drill = {
  /** What loses something alone, most ways first: the single points of failure. */
  readonly single: readonly DrillResult[];
  /** Faults that lose nothing. */
  readonly harmless: readonly Fault[];
  /** Minimal pairs, most ways lost beyond their parts first. */
  readonly pairs: readonly PairResult[];
};

/** The whole drill: every single fault, then every pair of printers with what only the pair loses. */
export const runDrill = (site: Site, plan: PlanContent, ways: Ways): Drill => {
  const drill = prepareDrill(site, plan, ways);
  const singles = singleFaults(site).map(drill);
  const alone = new Map(singles.flatMap((result) => (result.fault.kind === 'printer' ? [[result.fault.printer, result.classes] as const] : [])));
  const pairs = printerPairs(site).flatMap((fault): readonly PairResult[] => {
    if (fault.kind !== 'printers') return [];
    const result = drill(fault);
    const lostAlone = (number: number): boolean => fault.printers.some((printer) => alone.get(printer)?.has(number) ?? false);
    const beyond = [...result.classes].filter((number) => !lostAlone(number)).reduce((sum, number) => sum + (ways.classes[number]?.ways ?? 0), 0);
    return beyond === 0 ? [] : [{ ...result, beyond }];
  });
  return {
    single: singles.filter((result) => result.lostWays > 0).toSorted((left, right) => right.lostWays - left.lostWays),
    harmless: singles.filter((result) => result.lostWays === 0).map((result) => result.fault),
    pairs: pairs.toSorted((left, right) => right.beyond - left.beyond),
  };
};
