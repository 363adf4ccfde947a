import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { ItemRow } from '@/models/item';
import { SectionRow } from '@/models/section';

const moved = (): AppError => new AppError('conflict', 'Somebody added an item here or took one away in between. Nothing was put in order. Look at the section again, then order it.');

/** Puts the items of one menu section in an order; it has to name all of them. */
export const orderItems = (actor: Actor, ids: readonly string[]): Promise<{ readonly ordered: number }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const [first] = await ItemRow.findAll({ where: { siteId, id: ids[0] ?? '' }, transaction });
    if (first === undefined) throw moved();
    const rows = await ItemRow.findAll({ where: { siteId, sectionId: first.sectionId }, order: ['position', 'name'], transaction, lock: transaction.LOCK.UPDATE });
    const wanted = new Set(ids);
    if (wanted.size !== ids.length || rows.length !== ids.length || !rows.every((row) => wanted.has(row.id))) throw moved();
    // Two items of one section may have come in with the same position, so that the places are made apart first.
    const places = rows.map((row) => row.position).toSorted((left, right) => left - right);
    const apart = places.map((place, index) => place + (new Set(places).size === places.length ? 0 : index));
    for (const [index, id] of ids.entries()) await ItemRow.update({ position: apart[index] ?? index }, { where: { siteId, id }, transaction });
    const section = await SectionRow.findOne({ where: { siteId, id: first.sectionId }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.ordered', subjectKind: 'section', subjectId: first.sectionId, summary: `Items of ${section?.name ?? 'a menu section'} put in another order` });
    return { ordered: ids.length };
  });
