import type { StationId } from '@/lib/domain/site/ids';
import type { Divert, Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';

export type Hop = { readonly from: StationId; readonly to: StationId; readonly because: 'closed' | 'diverted' };

/** Where a station's work really goes at this moment, and how it got there. */
export type StationTrail = {
  readonly asked: StationId;
  readonly hops: readonly Hop[];
  /** Null when the chain ends or turns in a circle. */
  readonly reached: StationId | null;
  readonly lostBecause: 'no-stand-in' | 'circle' | 'unknown-station' | null;
};

/** The latest divert of a station wins, as the latest word does in a kitchen. */
const stationDiverts = (diverts: readonly Divert[]): ReadonlyMap<StationId, StationId> =>
  new Map(diverts.flatMap((divert) => (divert.kind === 'station' ? [[divert.from, divert.to] as const] : [])));

const follow = (
  asked: StationId,
  standIns: ReadonlyMap<StationId, StationId | null>,
  closed: ReadonlySet<StationId>,
  diverted: ReadonlyMap<StationId, StationId>,
): StationTrail => {
  const hops: Hop[] = [];
  const seen = new Set<StationId>();
  let station = asked;
  for (;;) {
    if (!standIns.has(station)) return { asked, hops, reached: null, lostBecause: 'unknown-station' };
    if (seen.has(station)) return { asked, hops, reached: null, lostBecause: 'circle' };
    seen.add(station);
    const divertedTo = diverted.get(station);
    const next: StationId | null | undefined = divertedTo ?? (closed.has(station) ? standIns.get(station) : undefined);
    if (next === undefined) return { asked, hops, reached: station, lostBecause: null };
    if (next === null) return { asked, hops, reached: null, lostBecause: 'no-stand-in' };
    hops.push({ from: station, to: next, because: divertedTo === undefined ? 'closed' : 'diverted' });
    station = next;
  }
};

/**
 * Follows diverts and stand-ins from every station once; the answer does not depend on the line.
 * A station met twice in a chain, or the chain's end, loses the line there.
 */
export const followStations = (site: Pick<Site, 'stations'>, present: Present): ReadonlyMap<StationId, StationTrail> => {
  const standIns = new Map(site.stations.map((station) => [station.id, station.standIn]));
  const closed = new Set(present.closedStations);
  const diverted = stationDiverts(present.diverts);
  return new Map(site.stations.map((station) => [station.id, follow(station.id, standIns, closed, diverted)]));
};
