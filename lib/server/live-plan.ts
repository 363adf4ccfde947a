import 'server-only';
import type { Transaction } from 'sequelize';
import type { LivePlan } from '@/lib/domain/site/site';
import { LiveTillRow } from '@/models/live-till';
import { SiteRow } from '@/models/site';

/** Makes a version of a plan the live one, and notes the tills that are set to it. The database refuses a version that never was. */
export const setLivePlan = async (transaction: Transaction, siteId: string, live: LivePlan, personId: string | null): Promise<void> => {
  const since = new Date(live.since);
  await SiteRow.update({ livePlanId: live.planId, liveVersion: live.version, liveSince: since }, { where: { id: siteId }, transaction });
  await LiveTillRow.bulkCreate(live.inForceOn.map((tillId) => ({ siteId, tillId, planId: live.planId, version: live.version, since, saidBy: personId })), {
    transaction, updateOnDuplicate: ['planId', 'version', 'since', 'saidBy'],
  });
};
