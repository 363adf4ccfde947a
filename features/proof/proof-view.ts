import { checkSite } from '@/lib/domain/checks/check-site';
import { bySeverity } from '@/lib/domain/findings/finding';
import { comparePlans } from '@/lib/domain/proof/compare';
import { runDrill, type DrillResult } from '@/lib/domain/proof/drill';
import { groupChanges, type ChangeGroup } from '@/lib/domain/proof/group-changes';
import { proposeFor, type Proposal } from '@/lib/domain/proof/propose';
import { provePlan, type Proof } from '@/lib/domain/proof/prove';
import { faultName } from '@/lib/domain/proof/report';
import type { ProofFinding } from '@/lib/domain/proof/summary';
import type { ItemId, StationId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell, presentOf, type Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';

/** What one proof says, ready to be read. */
export type ProofColumn = {
  readonly verdict: string;
  readonly lost: number;
  readonly partLost: number;
  readonly findings: readonly ProofFinding[];
};

export type DrillRow = {
  readonly key: string;
  readonly kind: string;
  readonly name: string;
  readonly lost: number;
  readonly partLost: number;
  readonly tills: readonly string[];
  /** A few of the items, by name. */
  readonly examples: readonly string[];
  readonly proposal: Proposal | null;
};

/** How many items of a section each station cooks, in at least one way to order. */
export type CoverageRow = { readonly section: string; readonly items: number; readonly cooked: readonly number[]; readonly lost: number };

export type ProofView = {
  readonly tried: string;
  readonly plan: ProofColumn;
  readonly now: ProofColumn;
  /** In words, what makes now differ from the plan; empty when nothing does. */
  readonly unusual: readonly string[];
  readonly single: readonly DrillRow[];
  readonly pairs: readonly DrillRow[];
  readonly harmless: number;
  readonly stations: readonly string[];
  readonly coverage: readonly CoverageRow[];
  /** Against the version that is live; null when nothing is, or this is it. */
  readonly changes: readonly ChangeGroup[] | null;
};

const counted = (count: number, one: string, many = `${one}s`): string => `${count.toLocaleString('en')} ${count === 1 ? one : many}`;

const itemsWith = (proof: Proof, outcome: 'lost' | 'part lost'): ReadonlySet<ItemId> =>
  new Set(proof.judgements.filter((one) => one.outcome === outcome).flatMap((one) => one.of.items));

const columnOf = (proof: Proof, more: readonly ProofFinding[]): ProofColumn => {
  const lost = itemsWith(proof, 'lost');
  const part = [...itemsWith(proof, 'part lost')].filter((item) => !lost.has(item));
  const verdict = proof.ways.total === 0 ? 'Nothing to order yet'
    : lost.size > 0 ? `${counted(lost.size, 'item')} would print nowhere`
      : part.length > 0 ? `${counted(part.length, 'item')} would print only in part`
        : 'Every item prints, from every till';
  return { verdict, lost: lost.size, partLost: part.length, findings: bySeverity([...proof.findings, ...more]) };
};

const faultKinds = { printer: 'Printer down', station: 'Station closed', till: 'Till off', 'shared-point': 'Off', printers: 'Both down' } as const;

const drillRow = (site: Site, plan: Plan, proof: Proof) => (result: DrillResult): DrillRow => ({
  key: JSON.stringify(result.fault),
  kind: faultKinds[result.fault.kind],
  name: faultName(site, result.fault),
  lost: result.lostItems.length,
  partLost: result.partLostItems.length,
  tills: site.tills.filter((till) => result.tills.includes(till.id)).map((till) => till.name),
  examples: [...result.lostItems, ...result.partLostItems].slice(0, 3).map((id) => site.menu.items.find((item) => item.id === id)?.name ?? ''),
  proposal: proposeFor(site, plan, proof.ways, result),
});

const coverageOf = (site: Site, proof: Proof): readonly CoverageRow[] => {
  const cooked = new Map<ItemId, Set<StationId>>();
  const lost = new Set<ItemId>();
  for (const { of, outcome } of proof.judgements) {
    for (const item of of.items) {
      const stations = cooked.get(item) ?? new Set();
      for (const station of of.cook.stations) stations.add(station);
      cooked.set(item, stations);
      if (outcome !== 'prints') lost.add(item);
    }
  }
  return site.menu.sections.flatMap((section) => {
    const items = site.menu.items.filter((item) => item.section === section.id && cooked.has(item.id));
    return items.length === 0 ? [] : [{
      section: section.name, items: items.length, lost: items.filter((item) => lost.has(item.id)).length,
      cooked: site.stations.map((station) => items.filter((item) => cooked.get(item.id)?.has(station.id)).length),
    }];
  });
};

const unusualWords = (site: Site, present: Present): readonly string[] => [
  ...site.stations.filter((station) => present.closedStations.includes(station.id)).map((station) => `${station.name} is closed.`),
  ...site.printers.filter((printer) => present.downPrinters.includes(printer.id)).map((printer) => `${printer.name} is down${printer.downReason === '' ? '' : `: ${printer.downReason}`}.`),
];

/** Everything the proof page shows of one plan: the plan as made, the kitchen as it is, the drill, coverage and what changed. */
export const viewProof = (site: Site, plan: Plan, live: Plan | null): ProofView => {
  const proof = provePlan(site, plan, allWell);
  const present = presentOf(site);
  const now = provePlan(site, plan, present);
  const checks = checkSite(site, plan).map((finding): ProofFinding => ({ ...finding, example: null }));
  const drill = runDrill(site, plan, proof.ways);
  const { ways } = proof;
  return {
    tried: `Tried ${counted(ways.total, 'way', 'ways')} to order: ${counted(ways.items, 'item')} and ${counted(ways.optionChoices, 'option')}, from ${counted(ways.tills, 'till')}, in ${counted(ways.orderTypes, 'order type')}, each once more with an allergy.`,
    plan: columnOf(proof, checks),
    now: columnOf(now, []),
    unusual: unusualWords(site, present),
    single: drill.single.map(drillRow(site, plan, proof)),
    pairs: drill.pairs.map(drillRow(site, plan, proof)),
    harmless: drill.harmless.length,
    stations: site.stations.map((station) => station.name),
    coverage: coverageOf(site, proof),
    changes: live === null || (live.id === plan.id && live.version === plan.version) ? null : groupChanges(site, comparePlans(site, live, plan).changes),
  };
};
