import type { ItemId, OptionId, PrinterId, StationId } from '@/lib/domain/site/ids';
import type { Rule } from '@/lib/domain/site/plan';
import type { PrinterChoice } from './choose-printer';
import type { CompiledRule, Context } from './compile-plan';
import { copyRules, sendCandidates, splitCandidates } from './find-winner';
import type { StationTrail } from './follow-stations';
import { decidedBy, type Dimension } from './narrowness';
import { cookDivertOf, type CookDivert, type Routing } from './routing';

export const outcomes = ['prints', 'part lost', 'lost'] as const;
export type Outcome = (typeof outcomes)[number];

/** Which rule won, over which others, and by what. */
export type Decision = {
  readonly winner: Rule | null;
  readonly beaten: readonly { readonly rule: Rule; readonly by: Dimension }[];
};

/** One station a rule asked for: where the work went, and the printer it came out of. */
export type StationRoute = {
  readonly asked: StationId;
  readonly trail: StationTrail;
  readonly reached: StationId | null;
  /** Null when no station was reached. */
  readonly choice: PrinterChoice | null;
  readonly printer: PrinterId | null;
};

export type CookPart = {
  readonly decision: Decision;
  readonly divert: CookDivert | null;
  /** One for each station asked for, in the rule's order; two may reach the same. */
  readonly routes: readonly StationRoute[];
  readonly outcome: Outcome;
};

export type SplitPart = {
  readonly option: OptionId;
  readonly decision: Decision;
  readonly keep: boolean;
  readonly routes: readonly StationRoute[];
  /** Stations that cook the dish too: there the option stays under it. */
  readonly withDish: readonly StationId[];
  readonly outcome: Outcome;
};

export type CopyRoute = StationRoute & { readonly rule: Rule };

/** A line and every step it went through; the record is the explanation. */
export type LineRoute = {
  readonly item: ItemId;
  readonly options: readonly OptionId[];
  readonly context: Context;
  readonly cook: CookPart;
  readonly splits: readonly SplitPart[];
  /** Copies to stations that do not cook the dish. */
  readonly copies: readonly CopyRoute[];
  readonly outcome: Outcome;
};

const decisionOf = (candidates: readonly CompiledRule[]): Decision => {
  const [winner, ...others] = candidates;
  if (winner === undefined) return { winner: null, beaten: [] };
  return { winner: winner.rule, beaten: others.map((other) => ({ rule: other.rule, by: decidedBy(winner.rule, other.rule) })) };
};

const unknownTrail = (asked: StationId): StationTrail => ({ asked, hops: [], reached: null, lostBecause: 'unknown-station' });

/** Steps 5 and 6 for one station, as things are now. */
export const routeToStation = (routing: Routing, asked: StationId, context: Pick<Context, 'till'>): StationRoute => {
  const trail = routing.trails.get(asked) ?? unknownTrail(asked);
  const choice = trail.reached === null ? null : routing.printers.choose(trail.reached, context.till);
  return { asked, trail, reached: trail.reached, choice, printer: choice?.printer ?? null };
};

/** `prints` when all do, `lost` when none does or nothing was asked for. */
const outcomeOfAll = (printed: readonly boolean[]): Outcome => {
  if (!printed.includes(true)) return 'lost';
  return printed.includes(false) ? 'part lost' : 'prints';
};

export const outcomeOfRoutes = (routes: readonly StationRoute[]): Outcome => outcomeOfAll(routes.map((route) => route.printer !== null));

const routeSplit = (routing: Routing, item: ItemId, option: OptionId, context: Context, cooking: ReadonlySet<StationId>): SplitPart | null => {
  const decision = decisionOf(splitCandidates(routing.plan, item, option, context));
  if (decision.winner === null) return null;
  const routes = decision.winner.stations.map((station) => routeToStation(routing, station, context));
  const reached = routes.flatMap((route) => (route.reached === null ? [] : [route.reached]));
  return {
    option,
    decision,
    keep: decision.winner.keep,
    routes,
    withDish: reached.filter((station) => cooking.has(station)),
    outcome: outcomeOfRoutes(routes),
  };
};

const routeCopies = (routing: Routing, item: ItemId, options: readonly OptionId[], context: Context, cooking: ReadonlySet<StationId>): readonly CopyRoute[] => {
  const copies: CopyRoute[] = [];
  const seen = new Set<StationId>();
  for (const { rule } of copyRules(routing.plan, item, options, context)) {
    for (const asked of rule.stations) {
      const route = routeToStation(routing, asked, context);
      const station = route.reached ?? asked;
      if (seen.has(station) || cooking.has(station)) continue;
      seen.add(station);
      copies.push({ ...route, rule });
    }
  }
  return copies;
};

/** Stations that cook the dish once diverts and closures have been followed. */
export const cookingStations = (routes: readonly StationRoute[]): ReadonlySet<StationId> =>
  new Set(routes.flatMap((route) => (route.reached === null ? [] : [route.reached])));

/**
 * Takes one dish with its options through the steps and keeps a record of each.
 *
 * The caller has already refused what the plan does not offer and set aside what needs no ticket.
 * Same input, same record, always; nothing is thrown for unknown stations, they lose the line in words.
 */
export const routeLine = (routing: Routing, item: ItemId, options: readonly OptionId[], context: Context): LineRoute => {
  const decision = decisionOf(sendCandidates(routing.plan, item, context));
  const divert = cookDivertOf(routing, item);
  const asked = divert?.to ?? decision.winner?.stations ?? [];
  const routes = asked.map((station) => routeToStation(routing, station, context));
  const cook: CookPart = { decision, divert, routes, outcome: outcomeOfRoutes(routes) };
  const cooking = cookingStations(routes);
  const splits = options.flatMap((option) => routeSplit(routing, item, option, context, cooking) ?? []);
  const copies = routeCopies(routing, item, options, context, cooking);
  const parts = [...routes, ...splits.flatMap((split) => split.routes)];
  const outcome = routes.length === 0 ? outcomeWithoutStation(splits) : outcomeOfRoutes(parts);
  return { item, options, context, cook, splits, copies, outcome };
};

/** A dish that no rule sends anywhere is lost, and part lost while one of its options still prints. */
const outcomeWithoutStation = (splits: readonly SplitPart[]): Outcome =>
  splits.some((split) => split.outcome !== 'lost') ? 'part lost' : 'lost';
