import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { lastChangeOf, recordChange } from '@/lib/server/history';
import { PlanRow } from '@/models/plan';
import type { RenamePlan } from '../schema';
import { mustBeFree } from './create-plan';
import { planMissing } from './read-plan';

/** A name is no part of a plan's content: its version stays, and what is live stays live under the new name. */
export const renamePlan = async (actor: Actor, planId: string, { name, was }: RenamePlan): Promise<{ readonly name: string }> =>
  actIn(actor, 'plan.write', async (transaction) => {
    const { siteId, person } = actor;
    const plan = await PlanRow.findOne({ where: { siteId, id: planId }, transaction, lock: transaction.LOCK.UPDATE });
    if (plan === null) throw planMissing();
    if (plan.name !== was) {
      throw new AppError('stale', `This plan is called ${plan.name} by now, so it was not renamed. Reload the page, then choose the name again.`, {
        changed: await lastChangeOf(siteId, 'plan', planId, transaction), current: { name: plan.name },
      });
    }
    await mustBeFree(siteId, name, planId, transaction);
    await plan.update({ name }, { transaction });
    await recordChange(transaction, { siteId, personId: person.id, action: 'plan.renamed', subjectKind: 'plan', subjectId: planId, summary: `${was} is now called ${name}`, before: { name: was }, after: { name } });
    return { name };
  });
