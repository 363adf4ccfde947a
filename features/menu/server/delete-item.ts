import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned } from '@/lib/server/versioned-update';
import { ItemRow } from '@/models/item';
import { RuleRow } from '@/models/rule';

export type ItemDeletion = { readonly item: string; readonly version: number };

/** An item that a rule names stays until the rule is gone, so that no plan loses a rule unseen. */
export const deleteItem = (actor: Actor, { item: id, version }: ItemDeletion): Promise<{ readonly id: string }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const rules = await RuleRow.count({ where: { siteId, itemId: id }, transaction });
    if (rules > 0) throw new AppError('conflict', `${rules === 1 ? 'A rule' : `${rules} rules`} on the board ${rules === 1 ? 'names' : 'name'} this item. Nothing was deleted. Take ${rules === 1 ? 'it' : 'them'} off there first, or mark the item as sold out.`);
    const row = await deleteVersioned(ItemRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.deleted', subjectKind: 'item', subjectId: id, summary: `${row.name} taken off the menu`, before: row.get({ plain: true }) });
    return { id };
  });
