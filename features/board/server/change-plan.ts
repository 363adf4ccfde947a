import 'server-only';
import type { PlanContent } from '@/lib/domain/site/plan';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { writePlanContent } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { StaleWrite } from '@/lib/server/versioned-update';
import { contentFaults } from './content-faults';
import { planMissing, readNewest } from './read-plan';

export type PlanChange = { readonly planId: string; readonly version: number; readonly content: PlanContent; readonly summary: string };

/** A stale write goes back with the newest content, so that the board can show it and do the change again on top. */
const staleWith = async (actor: Actor, planId: string): Promise<AppError> => {
  const [current, changed] = await Promise.all([readNewest(actor.siteId, planId, actor.person.id), lastChangeOf(actor.siteId, 'plan', planId)]);
  return new AppError('stale', `${current.changedBy} changed this plan while you did. Yours was not saved. The board shows the newest: do yours again on top of it, or leave it.`, { changed, current });
};

/** Makes the plan's next version. */
export const changePlan = async (actor: Actor, change: PlanChange): Promise<{ readonly version: number }> => {
  const { siteId, person } = actor;
  try {
    return await actIn(actor, 'plan.write', async (transaction) => {
      const site = await loadSite(siteId, transaction);
      const plan = site?.plans.find((candidate) => candidate.id === change.planId);
      if (site === null || plan === undefined) throw planMissing();
      const faults = contentFaults(site, change.content);
      // An older version is told as such first: what is gone from the site is then gone from the newest content too.
      if (faults.length > 0 && plan.version === change.version) {
        throw new AppError('invalid', `${faults[0]?.reason ?? ''} The plan was not saved. Reload the board to see what is there now.`, { fields: faults });
      }
      return writePlanContent(transaction, { siteId, personId: person.id, ...change });
    });
  } catch (error) {
    if (error instanceof StaleWrite) throw await staleWith(actor, change.planId);
    throw error;
  }
};
