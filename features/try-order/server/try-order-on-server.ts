import 'server-only';
import { tryOrder, type TriedOrder } from '@/lib/domain/orders/try-order';
import { allWell, presentOf } from '@/lib/domain/site/present';
import { AppError } from '@/lib/http/errors';
import { mustBeAllowed, type Actor } from '@/lib/server/actor';
import { loadSite } from '@/lib/server/site-snapshot';
import { planChoices, planOfKey } from '../plan-choices';
import type { TryOrderInput } from '../schema';
import { readLivePlan } from '@/lib/server/read-live-plan';

/** Tries an order with the engine that the browser uses, on the site as the database has it now. Nothing is written. */
export const tryOrderOnServer = async ({ membership, siteId, plan: key, present, order, time }: Actor & TryOrderInput): Promise<TriedOrder> => {
  mustBeAllowed(membership, 'order.try');
  const site = await loadSite(siteId);
  const plan = site === null ? null : planOfKey(planChoices(site, await readLivePlan(site)), key);
  if (site === null || plan === null) {
    throw new AppError('not-found', 'This plan is not there any more, so the order was not tried. Choose another plan.');
  }
  return tryOrder(site, plan, present === 'now' ? presentOf(site) : allWell, order, { time });
};
