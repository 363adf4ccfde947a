import { countBySeverity, type Finding } from '@/lib/domain/findings/finding';
import { boardOf } from '@/lib/domain/plans/board-of';
import { countWords, listWords } from '@/lib/domain/plans/words';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import { standInChain, stationFindings } from '@/lib/domain/stations/station-findings';

/** One line of the table. */
export type StationRow = {
  readonly station: Station;
  /** What hangs on its rail: "From the grill, Burgers and Sunday roast". */
  readonly cooks: string;
  readonly printers: readonly string[];
  /** "Sauce"; while it is closed, who really has its work. */
  readonly standIn: string;
  readonly findings: readonly Finding[];
};

export type StationsOverview = {
  readonly verdict: string;
  readonly said: string;
  readonly rows: readonly StationRow[];
};

const verdictOf = (stations: readonly Station[], findings: readonly Finding[]): string => {
  const { stop, check } = countBySeverity(findings);
  const closed = stations.filter((station) => !station.open);
  if (stations.length === 0) return 'No stations yet';
  if (stop + check > 0) return [...(stop === 0 ? [] : [`${stop} to fix`]), ...(check === 0 ? [] : [`${check} to look at`])].join(', ');
  if (closed.length > 0) return closed.length <= 2 ? `${listWords(closed.map((station) => station.name))} ${closed.length === 1 ? 'is' : 'are'} closed` : `${closed.length} of ${stations.length} stations are closed`;
  return stations.length === 1 ? 'The station is open' : `All ${stations.length} stations are open`;
};

const standInOf = (site: Site, station: Station): string => {
  const own = site.stations.find((one) => one.id === station.standIn)?.name ?? '';
  const open = station.open ? null : standInChain(site.stations, station).open;
  return open === null || open.id === station.standIn ? own : `${own}, closed, so ${open.name}`;
};

/** The stations of a site in their order, with what hangs on each under the live plan, or the first. */
export const stationsOverview = (site: Site): StationsOverview => {
  const plan = site.plans.find((one) => one.id === site.live?.planId) ?? site.plans[0];
  const rails = new Map((plan === undefined ? [] : boardOf(site, plan).rails).map((rail) => [rail.station, rail]));
  const cooksOf = (station: Station): string => {
    const rail = rails.get(station.id);
    const names = [...new Set((rail?.cards ?? []).filter((card) => card.kind === 'send').map((card) => card.name))];
    return rail?.wholeOrder === true ? ['A copy of every order', ...names].join(', ') : listWords(names);
  };
  const rows = site.stations.map((station): StationRow => ({
    station,
    cooks: cooksOf(station),
    printers: station.printers.map((id) => site.printers.find((printer) => printer.id === id)?.name ?? ''),
    standIn: standInOf(site, station),
    findings: stationFindings(site.stations, station),
  }));
  const passes = site.stations.filter((station) => station.kind === 'pass').length;
  return {
    verdict: verdictOf(site.stations, rows.flatMap((row) => row.findings)),
    said: site.stations.length === 0 ? '' : [
      `${countWords(site.stations.length - passes, 'station cooks', 'stations cook')}, ${passes === 0 ? 'and there is no pass' : countWords(passes, 'pass', 'passes')}.`,
      ...(plan === undefined ? [] : [`What each cooks is as in ${plan.name}.`]),
    ].join(' '),
    rows,
  };
};
