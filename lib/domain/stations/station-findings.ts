import { bySeverity, type Finding } from '../findings/finding';
import { listWords } from '../plans/words';
import type { StationId } from '../site/ids';
import type { Station } from '../site/station';
import { meshWords } from './station-words';

type AndMore = Pick<Finding, 'code' | 'severity' | 'title' | 'message'> & { readonly field: string };

const findingAt = (station: Station, { field, ...said }: AndMore): Finding => ({ ...said, subject: { kind: 'station', id: station.id, field }, fixes: [] });

/**
 * Where a closed station's work ends up: the stations met on the way, and the open one at the end; null when the chain
 * ends or comes round before an open one is met.
 */
export const standInChain = (stations: readonly Station[], station: Station): { readonly met: readonly Station[]; readonly open: Station | null } => {
  const byId = new Map(stations.map((one) => [one.id, one]));
  const met: Station[] = [];
  const seen = new Set<StationId>([station.id]);
  let next = station.standIn;
  while (next !== null && !seen.has(next)) {
    seen.add(next);
    const one = byId.get(next);
    if (one === undefined) break;
    met.push(one);
    if (one.open) return { met, open: one };
    next = one.standIn;
  }
  return { met, open: null };
};

const closedFinding = (stations: readonly Station[], station: Station): readonly Finding[] => {
  if (station.open) return [];
  const { met, open } = standInChain(stations, station);
  if (open !== null) return [];
  const shut = listWords(met.map((one) => one.name));
  return [findingAt(station, {
    code: 'station-closed-alone', severity: 'stop', field: 'standIn',
    title: met.length === 0 ? `${station.name} is closed and nobody stands in` : `${station.name} is closed, and so ${met.length === 1 ? 'is its stand-in' : 'are its stand-ins'}`,
    message: met.length === 0 ? 'What is sent there prints nowhere until it opens. Choose a stand-in that is open, or open it.' : `What is sent there would go to ${shut}, which ${met.length === 1 ? 'is' : 'are'} closed, so it prints nowhere. Choose another stand-in, or open one of them.`,
  })];
};

const silentFinding = (station: Station): readonly Finding[] => (station.printers.length > 0 ? [] : [findingAt(station, {
  code: 'station-without-printer', severity: 'check', field: 'printers',
  title: `${station.name} has no printer`, message: 'What is sent there would print nowhere. Choose the printer that stands beside it.',
})]);

const meshFinding = (stations: readonly Station[], station: Station): readonly Finding[] => {
  const same = stations.filter((one) => one.id !== station.id && one.mesh === station.mesh).map((one) => one.name);
  return same.length === 0 ? [] : [findingAt(station, {
    code: 'station-mesh-taken', severity: 'check', field: 'mesh',
    title: `${listWords(same)} ${same.length === 1 ? 'has' : 'have'} this mesh too`, message: `In a dim room and on paper only the code tells them apart. Choose another than ${meshWords[station.mesh].toLowerCase()}.`,
  })];
};

/** What there is to say of one station's own set-up, worst first; each finding names the field it is about. */
export const stationFindings = (stations: readonly Station[], station: Station): readonly Finding[] =>
  bySeverity([...closedFinding(stations, station), ...silentFinding(station), ...meshFinding(stations, station)]);
