import type { PlanContent } from '@/lib/domain/site/plan';
import { send } from '@/lib/http/client';
import { planUrl } from './plan-url';

export type PlanAnswer = { readonly content: PlanContent; readonly version: number; readonly changedBy: string; readonly byYou: boolean };

/** The newest content; null when it cannot be had now, which the next ping will mend. */
export const fetchPlan = async (siteId: string, planId: string): Promise<PlanAnswer | null> => {
  try {
    return await send<PlanAnswer>('GET', planUrl(siteId, planId));
  } catch {
    return null;
  }
};
