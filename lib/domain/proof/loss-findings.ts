import { listed, namesOf, type Names } from '@/lib/domain/routing/names-of';
import type { Fix } from '@/lib/domain/findings/finding';
import type { ItemId, SectionId, StationId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import type { Judgement, LossCause } from './judge';
import { likelyStation } from './likely-station';
import { sayWay, type ProofFinding } from './summary';

type Loss = { readonly judgement: Judgement; readonly cause: LossCause };

const itemsOf = (losses: readonly Loss[]): readonly ItemId[] => [...new Set(losses.flatMap(({ judgement }) => judgement.of.items))];

const countItems = (count: number): string => (count === 1 ? '1 item' : `${count} items`);

const example = (losses: readonly Loss[], site: Site): string => {
  const [first] = losses;
  return first === undefined ? '' : `For example: ${sayWay(first.judgement.of.first, site)}.`;
};

/** Splits items that no rule sends anywhere into whole sections and single items. */
const wholeSections = (site: Site, items: readonly ItemId[]): { readonly sections: readonly SectionId[]; readonly loose: readonly ItemId[] } => {
  const lost = new Set(items);
  const sections = site.menu.sections
    .filter((section) => {
      const own = site.menu.items.filter((item) => item.section === section.id && !item.noTicket);
      return own.length > 0 && own.every((item) => lost.has(item.id));
    })
    .map((section) => section.id);
  const inWhole = new Set<SectionId>(sections);
  const loose = site.menu.items.filter((item) => lost.has(item.id) && !inWhole.has(item.section)).map((item) => item.id);
  return { sections, loose };
};

const noRuleFindings = (losses: readonly Loss[], site: Site, plan: Plan, names: Names): readonly ProofFinding[] => {
  if (losses.length === 0) return [];
  const { sections, loose } = wholeSections(site, itemsOf(losses));
  const way = losses[0]?.judgement.of.first ?? null;
  const findings: ProofFinding[] = [];
  if (sections.length > 0) {
    const station = likelyStation(site, plan, sections);
    const fixes: readonly Fix[] = station === null ? [] : [{ kind: 'send-sections', plan: plan.id, sections, stations: [station], label: `Send to ${names.station(station)}` }];
    findings.push({
      code: 'section-without-station', severity: 'stop', subject: { kind: 'section', id: sections[0] ?? '' },
      title: `${listed(sections.map(names.section))} ${sections.length === 1 ? 'has' : 'have'} no station`,
      message: example(losses, site), fixes, example: way,
    });
  }
  if (loose.length > 0) {
    const first = losses.find(({ judgement }) => judgement.of.items.some((item) => loose.includes(item)));
    findings.push({
      code: 'item-without-station', severity: 'stop', subject: { kind: 'item', id: loose[0] ?? '' },
      title: loose.length === 1 ? `${names.item(loose[0]!)} has no station` : `${countItems(loose.length)} have no station in some ways to order`,
      message: first === undefined ? '' : `A rule covers ${loose.length === 1 ? 'it' : 'them'} only from some tills, areas or order types. ${example([first], site)}`,
      fixes: [], example: first?.judgement.of.first ?? way,
    });
  }
  return findings;
};

const whyNoPrinter = (site: Site, station: StationId, tills: readonly string[], names: Names): string => {
  const own = site.stations.find((one) => one.id === station)?.printers ?? [];
  if (own.length === 0) return `${names.station(station)} has no printer.`;
  const reached = `${listed(own.map(names.printer))} and ${own.length === 1 ? 'its backups' : 'their backups'}`;
  return `From ${listed(tills)}, ${reached} are out of reach or down.`;
};

const stationFinding = (site: Site, plan: Plan, station: StationId, losses: readonly Loss[], names: Names): ProofFinding => {
  const [first] = losses;
  const cause = first?.cause;
  const items = itemsOf(losses);
  const tills = [...new Set(losses.map(({ judgement }) => names.till(judgement.of.till)))];
  const everywhere = tills.length === site.tills.length;
  const shared = { severity: 'stop' as const, subject: { kind: 'station' as const, id: station }, fixes: [], example: first?.judgement.of.first ?? null };
  if (cause?.kind === 'no-printer') {
    return {
      ...shared, code: 'station-without-printer',
      title: `${names.station(station)} prints nowhere${everywhere ? '' : ` from ${listed(tills)}`}`,
      message: `${countItems(items.length)} would be lost there. ${whyNoPrinter(site, station, tills, names)} ${example(losses, site)}`,
    };
  }
  const circle = cause?.kind === 'circle';
  return {
    ...shared, code: circle ? 'station-in-circle' : 'station-closed',
    title: circle ? `${names.station(station)} hands on in a circle` : `${names.station(station)} is closed and nobody stands in`,
    message: `${countItems(items.length)} would be lost there. ${example(losses, site)}`,
  };
};

/** An allergy said with a line that prints only in part does not reach everybody who works on it. */
const allergyFinding = (judgements: readonly Judgement[], site: Site): readonly ProofFinding[] => {
  const part = judgements.filter((judgement) => judgement.outcome === 'part lost');
  const [first] = part;
  if (first === undefined) return [];
  const items = new Set(part.flatMap((judgement) => judgement.of.items));
  return [{
    code: 'allergy-does-not-reach', severity: 'stop', subject: { kind: 'plan', id: 'allergy' },
    title: `An allergy said with ${countItems(items.size)} would not reach every station`,
    message: `A part of the line prints and a part does not, so one cook never reads it. For example: ${sayWay(first.of.first, site)}.`,
    fixes: [], example: first.of.first,
  }];
};

/** Everything that an order would be lost by, grouped by its cause. */
export const lossFindings = (site: Site, plan: Plan, judgements: readonly Judgement[]): readonly ProofFinding[] => {
  const names = namesOf(site);
  const losses: readonly Loss[] = judgements.flatMap((judgement) => judgement.causes.map((cause) => ({ judgement, cause })));
  const byStation = new Map<string, Loss[]>();
  for (const loss of losses) {
    if (loss.cause.kind === 'no-rule') continue;
    const key = `${loss.cause.kind} ${loss.cause.station}`;
    byStation.set(key, [...(byStation.get(key) ?? []), loss]);
  }
  return [
    ...noRuleFindings(losses.filter(({ cause }) => cause.kind === 'no-rule'), site, plan, names),
    ...[...byStation.values()].flatMap((group) => {
      const cause = group[0]?.cause;
      return cause === undefined || cause.kind === 'no-rule' ? [] : [stationFinding(site, plan, cause.station, group, names)];
    }),
    ...allergyFinding(judgements, site),
  ];
};
