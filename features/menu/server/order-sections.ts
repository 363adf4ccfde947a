import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { SectionRow } from '@/models/section';

/** Puts all menu sections in an order; it has to name all of them. */
export const orderSections = (actor: Actor, ids: readonly string[]): Promise<{ readonly ordered: number }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const rows = await SectionRow.findAll({ where: { siteId }, transaction, lock: transaction.LOCK.UPDATE });
    const wanted = new Set(ids);
    if (wanted.size !== ids.length || rows.length !== ids.length || !rows.every((row) => wanted.has(row.id))) {
      throw new AppError('conflict', 'Somebody added a menu section or took one off in between. Nothing was put in order. Look at the menu again, then order it.');
    }
    for (const [position, id] of ids.entries()) await SectionRow.update({ position }, { where: { siteId, id }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.ordered', subjectKind: 'site', subjectId: null, summary: 'Menu sections put in another order' });
    return { ordered: ids.length };
  });
