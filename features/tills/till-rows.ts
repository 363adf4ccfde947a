import { checkSite } from '@/lib/domain/checks/check-site';
import { countBySeverity, type Finding } from '@/lib/domain/findings/finding';
import type { Site } from '@/lib/domain/site/site';
import type { Till } from '@/lib/domain/site/till';

/** One line of the table, with what is wrong on that till. */
export type TillRow = {
  readonly till: Till;
  readonly area: string;
  readonly printsThrough: string | null;
  readonly tested: number;
  readonly findings: readonly Finding[];
};

export type TillsOverview = { readonly verdict: string; readonly said: string; readonly rows: readonly TillRow[] };

const isOn = (till: Till) => ({ subject }: Finding): boolean =>
  (subject.kind === 'till' && subject.id === till.id) || (subject.kind === 'queue' && subject.till === till.id);

const verdictOf = (findings: readonly Finding[], tills: number): string => {
  const { stop, check } = countBySeverity(findings);
  if (tills === 0) return 'No tills yet';
  if (stop === 0 && check === 0) return tills === 1 ? 'The till is well' : `All ${tills} tills are well`;
  return [...(stop === 0 ? [] : [`${stop} to fix`]), ...(check === 0 ? [] : [`${check} to look at`])].join(', ');
};

/** The tills of a site with their findings; those with something to fix first, else in the site's order. */
export const tillsOverview = (site: Site): TillsOverview => {
  const live = site.plans.find((plan) => plan.id === site.live?.planId) ?? site.plans[0];
  const found = checkSite(site, live);
  const rows = site.tills.map((till): TillRow => ({
    till,
    area: site.areas.find((area) => area.id === till.area)?.name ?? '',
    printsThrough: site.tills.find((one) => one.id === till.printsThrough)?.name ?? null,
    tested: till.queues.filter((queue) => queue.testPrintedAt !== null).length,
    findings: found.filter(isOn(till)),
  }));
  const worst = (row: TillRow): number => (row.findings.some((finding) => finding.severity === 'stop') ? 0 : row.findings.length > 0 ? 1 : 2);
  return {
    verdict: verdictOf(rows.flatMap((row) => row.findings), rows.length),
    said: `${rows.length} ${rows.length === 1 ? 'till' : 'tills'} in ${site.areas.length} ${site.areas.length === 1 ? 'area' : 'areas'}.`,
    rows: rows.toSorted((left, right) => worst(left) - worst(right)),
  };
};
