import type { Plan, WeeklyTime } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { asId } from '@/lib/domain/site/ids';
import type { PlanVersion } from './plan-history';
import { slug } from './slug';

export type DemoPlan = { readonly name: string; readonly weeklyTimes: readonly WeeklyTime[]; readonly versions: readonly PlanVersion[] };

/** A restaurant as data: what it is, every version of its plans, and which of them is live, if one is. */
export type DemoSite = {
  readonly siteTestedAt: (testedAt: string) => Omit<Site, 'plans' | 'live'>;
  readonly plans: readonly DemoPlan[];
  readonly live: { readonly plan: string; readonly version: number } | null;
};

export const planId = (name: string): Plan['id'] => asId(slug(name));

/** The plan in its newest version. */
const newest = ({ name, weeklyTimes, versions }: DemoPlan, position: number): Plan => {
  const last = versions.at(-1);
  if (last === undefined) throw new Error(`The demo's plan ${name} has no version.`);
  return { ...last.content, id: planId(name), name, position, version: last.number, weeklyTimes };
};

/** The demo site as the rest of the product sees it; nothing is live yet. */
export const siteOf = (demo: DemoSite, testedAt: string): Site => ({ ...demo.siteTestedAt(testedAt), plans: demo.plans.map(newest), live: null });
