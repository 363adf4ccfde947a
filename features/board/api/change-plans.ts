import type { WeeklyTime } from '@/lib/domain/site/plan';
import { send } from '@/lib/http/client';
import { planUrl, plansUrl } from './plan-url';

export const createPlan = (siteId: string, name: string, from: string | null): Promise<{ readonly id: string }> =>
  send('POST', plansUrl(siteId), { body: { name, from } });

export const renamePlan = (siteId: string, planId: string, name: string, was: string): Promise<unknown> =>
  send('PATCH', planUrl(siteId, planId), { body: { name, was } });

export const deletePlan = (siteId: string, planId: string, version: number): Promise<unknown> =>
  send('DELETE', planUrl(siteId, planId), { version });

export const orderPlans = (siteId: string, plans: readonly string[]): Promise<unknown> =>
  send('PUT', `${plansUrl(siteId)}/order`, { body: { plans } });

export const setWeeklyTimes = (siteId: string, planId: string, weeklyTimes: readonly WeeklyTime[], was: readonly WeeklyTime[]): Promise<unknown> =>
  send('PUT', `${planUrl(siteId, planId)}/weekly-times`, { body: { weeklyTimes, was } });
