import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, RowMissing, StaleWrite } from '@/lib/server/versioned-update';
import { PlanRow } from '@/models/plan';
import { SiteRow } from '@/models/site';
import { WeeklyTimeRow } from '@/models/weekly-time';
import { planMissing } from './read-plan';

/** Deletes a plan with its versions. The live one stays, and so does one that a weekly time would put live. */
export const deletePlan = async (actor: Actor, planId: string, version: number): Promise<{ readonly deleted: string }> => {
  const { siteId, person } = actor;
  try {
    return await actIn(actor, 'plan.write', async (transaction) => {
      const site = await SiteRow.findByPk(siteId, { transaction, lock: transaction.LOCK.UPDATE });
      if (site?.livePlanId === planId) {
        throw new AppError('conflict', 'This plan is live: the tills print by it. It was not deleted. Put another plan live first.');
      }
      const starts = await WeeklyTimeRow.count({ where: { siteId, planId }, transaction });
      if (starts > 0) {
        throw new AppError('conflict', `This plan goes live by itself ${starts === 1 ? 'once' : `${starts} times`} a week. It was not deleted. Remove its weekly times first.`);
      }
      const plan = await deleteVersioned(PlanRow, { siteId, id: planId, version }, transaction);
      await recordChange(transaction, { siteId, personId: person.id, action: 'plan.deleted', subjectKind: 'plan', subjectId: planId, summary: `Plan ${plan.name} deleted` });
      return { deleted: planId };
    });
  } catch (error) {
    if (error instanceof StaleWrite) {
      throw new AppError('stale', 'Somebody changed this plan since you opened it, so it was not deleted. Look at it again, then delete it if you still want to.', { current: { version: error.version } });
    }
    if (error instanceof RowMissing) throw planMissing();
    throw error;
  }
};
