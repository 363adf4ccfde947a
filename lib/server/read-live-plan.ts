import 'server-only';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { readPlanVersion } from '@/lib/server/plan-store';

/** The plan as it is live, which may be an earlier version than the one being edited; null when none is live. */
export const readLivePlan = async (site: Site): Promise<Plan | null> => {
  const { live } = site;
  const plan = site.plans.find(({ id }) => id === live?.planId);
  if (live === null || plan === undefined) return null;
  if (plan.version === live.version) return plan;
  const content = await readPlanVersion(site.id, live.planId, live.version);
  return content === null ? null : { ...plan, ...content, version: live.version };
};
