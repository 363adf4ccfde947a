import type { Context } from '@/lib/domain/routing/compile-plan';
import { copyRules, findSendWinner, findSplitWinner } from '@/lib/domain/routing/find-winner';
import { cookDivertOf, prepareRouting, type Routing } from '@/lib/domain/routing/routing';
import type { ItemId, OptionId, PrinterId, StationId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { triedItems } from './enumerate-ways';

export const changeKinds = ['moved', 'newly-lost', 'newly-printing'] as const;
export type ChangeKind = (typeof changeKinds)[number];

/** The part of a way to order that prints differently: the dish, one of its options, or its copies. */
export type Part = { readonly kind: 'dish' } | { readonly kind: 'option'; readonly option: OptionId } | { readonly kind: 'copy' };

/** Where a part ends: stations by position, each with its printer; null where the line is lost. */
export type End = readonly { readonly station: StationId; readonly printer: PrinterId | null }[];

export type Change = {
  readonly kind: ChangeKind;
  readonly part: Part;
  readonly before: End;
  readonly after: End;
  readonly item: ItemId;
  readonly context: Context;
};

export type Comparison = {
  readonly changes: readonly Change[];
  /** Parts of ways to order that print the same under both. */
  readonly unchanged: number;
};

const contextsOf = (site: Site): readonly Context[] =>
  site.tills.flatMap((till) => till.orderTypes.map((orderType) => ({ orderType, area: till.area, till: till.id })));

const endOf = (routing: Routing, asked: readonly StationId[], context: Context, leaveOut: ReadonlySet<StationId> = new Set()): End => {
  const ends = new Map<StationId, PrinterId | null>();
  for (const station of asked) {
    const reached = routing.trails.get(station)?.reached ?? null;
    if (reached === null) ends.set(station, null);
    else if (!leaveOut.has(reached)) ends.set(reached, routing.printers.printerFor(reached, context.till));
  }
  return [...ends].map(([station, printer]) => ({ station, printer })).toSorted((left, right) => (left.station < right.station ? -1 : 1));
};

type Parts = ReadonlyMap<string, { readonly part: Part; readonly end: End }>;

/** Null when the plan does not offer the item at all. */
const partsOf = (routing: Routing, item: ItemId, options: readonly OptionId[], context: Context): Parts => {
  const asked = cookDivertOf(routing, item)?.to ?? findSendWinner(routing.plan, item, context)?.stations ?? [];
  const dish = endOf(routing, asked, context);
  const cooking = new Set(dish.map((end) => end.station));
  const copied = copyRules(routing.plan, item, [], context).flatMap((rule) => rule.stations);
  const parts = new Map<string, { part: Part; end: End }>([
    ['dish', { part: { kind: 'dish' }, end: dish }],
    ['copy', { part: { kind: 'copy' }, end: endOf(routing, copied, context, cooking) }],
  ]);
  for (const option of options) {
    const split = findSplitWinner(routing.plan, item, option, context);
    parts.set(option, { part: { kind: 'option', option }, end: split === null ? dish : endOf(routing, split.stations, context) });
  }
  return parts;
};

const printsWhole = (end: End): boolean => end.length > 0 && end.every(({ printer }) => printer !== null);

const kindOf = (part: Part, before: End, after: End): ChangeKind => {
  const copy = part.kind === 'copy';
  const had = copy ? before.some(({ printer }) => printer !== null) : printsWhole(before);
  const has = copy ? after.some(({ printer }) => printer !== null) : printsWhole(after);
  if (had === has) return 'moved';
  return had ? 'newly-lost' : 'newly-printing';
};

const sameEnd = (left: End, right: End): boolean =>
  left.length === right.length && left.every((end, index) => end.station === right[index]?.station && end.printer === right[index]?.printer);

/**
 * Compares where every way to order prints under two plans, or two versions of one, with everything well.
 * An item that one of them does not offer is lost there. Options count as part of the dish until a rule splits them, and
 * are reported on their own only when they change otherwise than their dish.
 */
export const comparePlans = (site: Site, before: Plan, after: Plan): Comparison => {
  const contexts = contextsOf(site);
  const routings = { before: prepareRouting(site, before, allWell), after: prepareRouting(site, after, allWell) };
  const offered = { before: new Set(triedItems(site, before).map((item) => item.id)), after: new Set(triedItems(site, after).map((item) => item.id)) };
  const optionsOf = new Map(site.menu.optionGroups.map((group) => [group.id, group.options]));
  const changes: Change[] = [];
  let unchanged = 0;

  for (const item of site.menu.items) {
    if (!offered.before.has(item.id) && !offered.after.has(item.id)) continue;
    const options = item.optionGroups.flatMap((group) => optionsOf.get(group) ?? []);
    for (const context of contexts) {
      const was = partsOf(routings.before, item.id, options, context);
      const is = partsOf(routings.after, item.id, options, context);
      const dish = { before: offered.before.has(item.id) ? was.get('dish')!.end : [], after: offered.after.has(item.id) ? is.get('dish')!.end : [] };
      for (const [key, { part, end }] of is) {
        const from = offered.before.has(item.id) ? was.get(key)?.end ?? [] : [];
        const to = offered.after.has(item.id) ? end : [];
        const followsDish = part.kind === 'option' && sameEnd(from, dish.before) && sameEnd(to, dish.after);
        if (sameEnd(from, to) || followsDish) unchanged += followsDish && !sameEnd(from, to) ? 0 : 1;
        else changes.push({ kind: kindOf(part, from, to), part, before: from, after: to, item: item.id, context });
      }
    }
  }
  return { changes, unchanged };
};
