import type { SectionId, StationId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';

const sectionTargets = (plan: Plan, sections: readonly SectionId[]): readonly StationId[] =>
  plan.rules.flatMap((rule) => (rule.kind === 'send' && rule.target.kind === 'section' && sections.includes(rule.target.section) ? rule.stations : []));

/**
 * The station to offer for sections that have none: the one that cooks them in most other plans, else the prep
 * station whose rails carry least. Null when the site has no prep station.
 */
export const likelyStation = (site: Site, plan: Plan, sections: readonly SectionId[]): StationId | null => {
  const prep = site.stations.filter((station) => station.kind === 'prep');
  const votes = new Map<StationId, number>();
  for (const other of site.plans) {
    if (other.id === plan.id) continue;
    for (const station of sectionTargets(other, sections)) votes.set(station, (votes.get(station) ?? 0) + 1);
  }
  const load = (station: StationId): number => plan.rules.filter((rule) => rule.kind === 'send' && rule.stations.includes(station)).length;
  const [best] = prep.toSorted((left, right) =>
    (votes.get(right.id) ?? 0) - (votes.get(left.id) ?? 0)
    || load(left.id) - load(right.id)
    || left.name.localeCompare(right.name, 'en'));
  return best?.id ?? null;
};
