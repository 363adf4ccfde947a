import type { Outcome } from '@/lib/domain/routing/route-line';
import type { Routing } from '@/lib/domain/routing/routing';
import type { StationId, TillId } from '@/lib/domain/site/ids';
import type { Ask, WayClass } from './way';

/** Why a part of a class prints nowhere. */
export type LossCause =
  | { readonly kind: 'no-rule' }
  | { readonly kind: 'no-stand-in'; readonly station: StationId }
  | { readonly kind: 'circle'; readonly station: StationId }
  | { readonly kind: 'no-printer'; readonly station: StationId };

export type Judgement = {
  readonly of: WayClass;
  readonly outcome: Outcome;
  readonly causes: readonly LossCause[];
  /** Copies that print nowhere, by the station that misses them. */
  readonly lostCopies: readonly StationId[];
  /** Stations whose printer prints any of it, cooking, split or copy. */
  readonly reached: readonly StationId[];
};

type Fate = { readonly reached: StationId | null; readonly prints: boolean; readonly cause: LossCause | null };

/** The fate of one asked station from one till; worked out once for each pair. */
const fates = (routing: Routing) => {
  const known = new Map<TillId, Map<StationId, Fate>>();
  const workOut = (station: StationId, till: TillId): Fate => {
    const trail = routing.trails.get(station);
    if (trail === undefined || trail.reached === null) {
      return { reached: null, prints: false, cause: { kind: trail?.lostBecause === 'circle' ? 'circle' : 'no-stand-in', station } };
    }
    const prints = routing.printers.printerFor(trail.reached, till) !== null;
    return { reached: trail.reached, prints, cause: prints ? null : { kind: 'no-printer', station: trail.reached } };
  };
  return (station: StationId, till: TillId): Fate => {
    let ofTill = known.get(till);
    if (ofTill === undefined) known.set(till, (ofTill = new Map()));
    let fate = ofTill.get(station);
    if (fate === undefined) ofTill.set(station, (fate = workOut(station, till)));
    return fate;
  };
};

/** Says for each class what becomes of it under one state of the kitchen. */
export const judgeWith = (routing: Routing) => {
  const fateOf = fates(routing);

  const outcomeOf = ({ cook, splits, till }: WayClass): Outcome => {
    let printed = 0;
    let lost = cook.stations.length === 0 ? 1 : 0;
    const count = (ask: Ask): void => {
      for (const station of ask.stations) {
        if (fateOf(station, till).prints) printed += 1;
        else lost += 1;
      }
    };
    count(cook);
    for (const split of splits) count(split);
    if (printed === 0) return 'lost';
    return lost === 0 ? 'prints' : 'part lost';
  };

  const judge = (of: WayClass): Judgement => {
    const parts = [...of.cook.stations, ...of.splits.flatMap((split) => split.stations)].map((station) => fateOf(station, of.till));
    const cooking = new Set(of.cook.stations.map((station) => fateOf(station, of.till).reached));
    const copies = of.copies.stations
      .map((station) => ({ station, fate: fateOf(station, of.till) }))
      .filter(({ fate }) => fate.reached === null || !cooking.has(fate.reached));
    const causes: LossCause[] = of.cook.stations.length === 0 ? [{ kind: 'no-rule' }] : [];
    for (const { cause } of parts) if (cause !== null && !causes.some((known) => sameCause(known, cause))) causes.push(cause);
    const printing = [...parts, ...copies.map(({ fate }) => fate)].filter((fate) => fate.prints);
    return {
      of,
      outcome: outcomeOf(of),
      causes,
      lostCopies: copies.filter(({ fate }) => !fate.prints).map(({ station, fate }) => fate.reached ?? station),
      reached: [...new Set(printing.flatMap((fate) => (fate.reached === null ? [] : [fate.reached])))],
    };
  };

  return { judge, outcomeOf };
};

const sameCause = (left: LossCause, right: LossCause): boolean =>
  left.kind === right.kind && (left.kind === 'no-rule' || (right.kind !== 'no-rule' && left.station === right.station));
