import type { Site } from '@/lib/domain/site/site';

export type LiveWords = { readonly plan: string; readonly inForce: string; readonly everywhere: boolean };

/** What is live and on how many tills it is in force; null when nothing is live. */
export const liveWords = (site: Pick<Site, 'live' | 'plans' | 'tills'>): LiveWords | null => {
  if (site.live === null) return null;
  const { planId, inForceOn } = site.live;
  const inForce = site.tills.filter((till) => inForceOn.includes(till.id)).length;
  return {
    plan: site.plans.find((plan) => plan.id === planId)?.name ?? 'A plan',
    inForce: `in force on ${inForce} of ${site.tills.length} ${site.tills.length === 1 ? 'till' : 'tills'}`,
    everywhere: inForce === site.tills.length,
  };
};
