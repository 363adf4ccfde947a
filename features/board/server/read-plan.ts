import 'server-only';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import type { PlanContent } from '@/lib/domain/site/plan';
import { lastChangeOf } from '@/lib/server/history';
import { mustBeAllowed, type Actor } from '@/lib/server/actor';
import { readPlanVersion } from '@/lib/server/plan-store';
import { PlanRow } from '@/models/plan';
import { PlanVersionRow } from '@/models/plan-version';

export type PlanReading = {
  readonly content: PlanContent;
  readonly version: number;
  /** Who made this version. */
  readonly changedBy: string;
  readonly byYou: boolean;
};

export const planMissing = (): AppError =>
  new AppError('not-found', 'This plan is not there any more: somebody may have deleted it. Nothing was changed. Open the board again to see the plans that are.');

/** The newest version of a plan's content, and whose it is. */
export const readNewest = async (siteId: string, planId: string, personId: string, transaction?: Transaction): Promise<PlanReading> => {
  const plan = await PlanRow.findOne({ where: { siteId, id: planId }, transaction: transaction ?? null });
  if (plan === null) throw planMissing();
  const [content, change, version] = await Promise.all([
    readPlanVersion(siteId, planId, plan.version, transaction),
    lastChangeOf(siteId, 'plan', planId, transaction),
    PlanVersionRow.findOne({ where: { siteId, planId, number: plan.version }, attributes: ['siteId', 'planId', 'number', 'madeBy'], transaction: transaction ?? null }),
  ]);
  if (content === null) throw planMissing();
  return { content, version: plan.version, changedBy: change?.by ?? 'Tamis', byYou: version?.madeBy === personId };
};

export const readPlan = async (actor: Actor, planId: string): Promise<PlanReading> => {
  mustBeAllowed(actor.membership, 'site.read');
  return readNewest(actor.siteId, planId, actor.person.id);
};
