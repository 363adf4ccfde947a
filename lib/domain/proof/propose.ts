import type { Fix } from '@/lib/domain/findings/finding';
import { listed } from '@/lib/domain/routing/names-of';
import type { PrinterId, StationId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import { prepareDrill, type DrillResult } from './drill';
import type { Ways } from './way';

/** The backup or stand-in that would close most of a gap, with what it still leaves open. */
export type Proposal = {
  readonly fix: Fix;
  /** Ways to order that would still be lost with it. */
  readonly leavesLost: number;
  /** Said with the proposal when both hang on the same plug; empty otherwise. */
  readonly warning: string;
};

const sharedPointNames = (site: Site, left: Printer, right: Printer): readonly string[] =>
  site.sharedPoints.filter((point) => left.sharedPoints.includes(point.id) && right.sharedPoints.includes(point.id)).map((point) => point.name);

const withBackup = (site: Site, printer: PrinterId, backup: PrinterId): Site =>
  ({ ...site, printers: site.printers.map((one) => (one.id === printer ? { ...one, backup } : one)) });

const withStandIn = (site: Site, station: StationId, standIn: StationId): Site =>
  ({ ...site, stations: site.stations.map((one) => (one.id === station ? { ...one, standIn } : one)) });

type Candidate = { readonly name: string; readonly used: number; readonly leavesLost: number; readonly make: () => Proposal };

/** Fewest lines lost, then the least used, then by name. */
const best = (candidates: readonly Candidate[]): Candidate | undefined =>
  candidates.toSorted((left, right) => left.leavesLost - right.leavesLost || left.used - right.used || left.name.localeCompare(right.name, 'en'))[0];

const backupCandidates = (site: Site, plan: PlanContent, ways: Ways, printer: Printer): readonly Candidate[] =>
  site.printers.filter((other) => other.id !== printer.id && other.id !== printer.backup).map((other) => {
    const { lostWays } = prepareDrill(withBackup(site, printer.id, other.id), plan, ways)({ kind: 'printer', printer: printer.id });
    const shared = sharedPointNames(site, printer, other);
    return {
      name: other.name,
      used: site.stations.filter((station) => station.printers.includes(other.id)).length + site.printers.filter((one) => one.backup === other.id).length,
      leavesLost: lostWays,
      make: () => ({
        fix: { kind: 'set-backup', printer: printer.id, backup: other.id, label: `Let ${other.name} back it up` },
        leavesLost: lostWays,
        warning: shared.length === 0 ? '' : `Both hang on ${listed(shared)}: when that is off, both are.`,
      }),
    };
  });

const standInCandidates = (site: Site, plan: PlanContent, ways: Ways, station: StationId): readonly Candidate[] =>
  site.stations.filter((other) => other.id !== station && other.kind === 'prep').map((other) => {
    const { lostWays } = prepareDrill(withStandIn(site, station, other.id), plan, ways)({ kind: 'station', station });
    return {
      name: other.name,
      used: site.stations.filter((one) => one.standIn === other.id).length,
      leavesLost: lostWays,
      make: () => ({
        fix: { kind: 'set-stand-in', station, standIn: other.id, label: `Let ${other.name} stand in` },
        leavesLost: lostWays,
        warning: '',
      }),
    };
  });

/** What would help against one fault, or null when nothing on the site would. */
export const proposeFor = (site: Site, plan: PlanContent, ways: Ways, result: DrillResult): Proposal | null => {
  const { fault } = result;
  if (result.lostWays === 0) return null;
  const printer = fault.kind === 'printer' ? site.printers.find((one) => one.id === fault.printer) : undefined;
  const candidates = printer !== undefined ? backupCandidates(site, plan, ways, printer)
    : fault.kind === 'station' ? standInCandidates(site, plan, ways, fault.station) : [];
  const chosen = best(candidates);
  return chosen === undefined || chosen.leavesLost >= result.lostWays ? null : chosen.make();
};
