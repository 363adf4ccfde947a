import { bySeverity, type Finding } from '@/lib/domain/findings/finding';
import type { ItemId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell, type Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { prepareDrill } from './drill';
import { provePlan, type Proof } from './prove';
import { meshCells, type DrillLine, type ProofFinding, type ProofMesh, type ProofSummary } from './summary';

const itemsWith = (proof: Proof, outcome: 'lost' | 'part lost'): ReadonlySet<ItemId> =>
  new Set(proof.judgements.filter((judgement) => judgement.outcome === outcome).flatMap((judgement) => judgement.of.items));

const meshOf = ({ ways, judgements }: Proof): ProofMesh => {
  const cells = Math.min(meshCells, ways.total);
  const lostClasses = new Set(judgements.filter((judgement) => judgement.outcome !== 'prints').map((judgement) => judgement.of.number));
  const lost = new Set<number>();
  ways.classOfWay.forEach((number, way) => {
    if (lostClasses.has(number)) lost.add(Math.floor((way * cells) / ways.total));
  });
  return { cells, total: ways.total, lost: [...lost] };
};

/** What each printer that a station uses would take with it, most items first, then by name. */
const drillLines = (site: Site, plan: Plan, proof: Proof): readonly DrillLine[] => {
  const drill = prepareDrill(site, plan, proof.ways);
  const used = new Set(site.stations.flatMap((station) => station.printers));
  return site.printers
    .filter((printer) => used.has(printer.id))
    .map((printer): DrillLine => {
      const { lostItems, tills } = drill({ kind: 'printer', printer: printer.id });
      return { printer: printer.id, name: printer.name, itemsLost: lostItems.length, tillsAffected: lostItems.length === 0 ? 0 : tills.length };
    })
    .toSorted((left, right) => right.itemsLost - left.itemsLost || left.name.localeCompare(right.name, 'en'));
};

/** A proof as the board shows it, together with what the checks of names and addresses found. */
export const summarise = (site: Site, plan: Plan, siteFindings: readonly Finding[], present: Present = allWell): ProofSummary => {
  const proof = provePlan(site, plan, present);
  const lost = itemsWith(proof, 'lost');
  const part = [...itemsWith(proof, 'part lost')].filter((item) => !lost.has(item));
  return {
    lostItems: lost.size,
    partLostItems: part.length,
    ways: proof.ways.total,
    items: proof.ways.items,
    options: proof.ways.optionChoices,
    tills: proof.ways.tills,
    orderTypes: proof.ways.orderTypes,
    mesh: meshOf(proof),
    findings: bySeverity<ProofFinding>([...proof.findings, ...siteFindings.map((finding) => ({ ...finding, example: null }))]),
    drill: drillLines(site, plan, proof),
  };
};
