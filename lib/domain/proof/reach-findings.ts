import { listed, namesOf } from '@/lib/domain/routing/names-of';
import type { ItemId, PrinterId, StationId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import type { Judgement } from './judge';
import { sayWay, type ProofFinding } from './summary';

const lostCopyFindings = (site: Site, judgements: readonly Judgement[]): readonly ProofFinding[] => {
  const names = namesOf(site);
  const byStation = new Map<StationId, Judgement[]>();
  for (const judgement of judgements) {
    for (const station of judgement.lostCopies) byStation.set(station, [...(byStation.get(station) ?? []), judgement]);
  }
  return [...byStation].map(([station, lost]): ProofFinding => {
    const tills = [...new Set(lost.map((judgement) => names.till(judgement.of.till)))];
    return {
      code: 'copy-lost', severity: 'check', subject: { kind: 'station', id: station },
      title: `${names.station(station)} misses its copies from ${listed(tills)}`,
      message: `The dishes print where they are cooked, and ${names.station(station)} does not see them.`,
      fixes: [], example: lost[0]?.of.first ?? null,
    };
  });
};

/** Items that in some way to order never print at a pass, on a site that has one. */
const unseenFinding = (site: Site, judgements: readonly Judgement[]): readonly ProofFinding[] => {
  const passes = new Set(site.stations.filter((station) => station.kind === 'pass').map((station) => station.id));
  if (passes.size === 0) return [];
  const unseen = judgements.filter((judgement) => judgement.outcome !== 'lost' && !judgement.reached.some((station) => passes.has(station)));
  const items = new Set<ItemId>(unseen.flatMap((judgement) => judgement.of.items));
  const [first] = unseen;
  if (first === undefined) return [];
  return [{
    code: 'no-pass-sees-it', severity: 'check', subject: { kind: 'plan', id: 'pass' },
    title: `${items.size === 1 ? '1 item never shows' : `${items.size} items never show`} at the pass`,
    message: `Nobody there can check ${items.size === 1 ? 'it' : 'them'} before sending out. For example: ${sayWay(first.of.first, site)}.`,
    fixes: [], example: first.of.first,
  }];
};

const idleStations = (site: Site, judgements: readonly Judgement[]): readonly ProofFinding[] => {
  const reached = new Set(judgements.flatMap((judgement) => judgement.reached));
  const asked = new Set(judgements.flatMap(({ of }) => [...of.cook.stations, ...of.copies.stations, ...of.splits.flatMap((split) => split.stations)]));
  const standIns = new Set(site.stations.map((station) => station.standIn));
  return site.stations.filter((station) => !reached.has(station.id) && !asked.has(station.id)).map((station): ProofFinding => {
    const only = standIns.has(station.id);
    return {
      code: only ? 'station-only-stand-in' : 'station-idle', severity: only ? 'note' : 'check', subject: { kind: 'station', id: station.id },
      title: only ? `${station.name} only stands in` : `Nothing goes to ${station.name}`,
      message: only ? 'It gets work when the station it stands in for is closed, and not before.' : 'No rule of this plan sends anything there.',
      fixes: [], example: null,
    };
  });
};

const idlePrinters = (site: Site): readonly ProofFinding[] => {
  const used = new Set<PrinterId>(site.stations.flatMap((station) => station.printers));
  const backups = new Set(site.printers.map((printer) => printer.backup));
  return site.printers.filter((printer) => !used.has(printer.id)).map((printer): ProofFinding => {
    const only = backups.has(printer.id);
    return {
      code: only ? 'printer-only-backup' : 'printer-idle', severity: only ? 'note' : 'check', subject: { kind: 'printer', id: printer.id },
      title: only ? `${printer.name} is only a backup` : `No station uses ${printer.name}`,
      message: only ? 'It prints when the printer it backs up is down, and not before.' : 'Nothing prints on it. Give it to a station, or take it off the list.',
      fixes: [], example: null,
    };
  });
};

export const reachFindings = (site: Site, judgements: readonly Judgement[]): readonly ProofFinding[] => [
  ...lostCopyFindings(site, judgements),
  ...unseenFinding(site, judgements),
  ...idleStations(site, judgements),
  ...idlePrinters(site),
];
