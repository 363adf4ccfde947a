import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { PlanRow } from '@/models/plan';

/** The order of the tabs. All plans of the site are named, so that one added meanwhile is not lost between them. */
export const orderPlans = async (actor: Actor, plans: readonly string[]): Promise<{ readonly plans: readonly string[] }> =>
  actIn(actor, 'plan.write', async (transaction) => {
    const { siteId, person } = actor;
    const rows = await PlanRow.findAll({ where: { siteId }, order: ['position', 'name'], transaction, lock: transaction.LOCK.UPDATE });
    const standing = rows.map((row) => row.id);
    if (plans.length !== standing.length || !standing.every((id) => plans.includes(id))) {
      throw new AppError('stale', 'A plan was added or deleted meanwhile, so the order was not saved. Reload the page, then order them again.', { current: { plans: standing } });
    }
    for (const row of rows) await row.update({ position: plans.indexOf(row.id) }, { transaction });
    const names = plans.map((id) => rows.find((row) => row.id === id)?.name ?? '').join(', ');
    await recordChange(transaction, { siteId, personId: person.id, action: 'plans.ordered', subjectKind: 'site', subjectId: siteId, summary: `Plans ordered: ${names}` });
    return { plans };
  });
