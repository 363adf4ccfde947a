import 'server-only';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned } from '@/lib/server/versioned-update';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { OptionRow } from '@/models/option';
import { OptionGroupRow } from '@/models/option-group';
import { RuleRow } from '@/models/rule';

export type OptionGroupDeletion = { readonly group: string; readonly version: number };

/** A group goes when no item comes with it and no rule names one of its options. */
export const deleteOptionGroup = (actor: Actor, { group: id, version }: OptionGroupDeletion): Promise<{ readonly id: string }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const used = await ItemOptionGroupRow.count({ where: { siteId, optionGroupId: id }, transaction });
    if (used > 0) throw new AppError('conflict', `${used === 1 ? 'An item comes' : `${used} items come`} with these options. Nothing was deleted. Take the group off ${used === 1 ? 'it' : 'them'} first.`);
    const options = await OptionRow.findAll({ where: { siteId, optionGroupId: id }, transaction });
    const ruled = await RuleRow.count({ where: { siteId, optionId: options.map((option) => option.id) }, transaction });
    if (ruled > 0) throw new AppError('conflict', `${ruled === 1 ? 'A rule' : `${ruled} rules`} on the board ${ruled === 1 ? 'names' : 'name'} one of these options. Nothing was deleted. Take ${ruled === 1 ? 'it' : 'them'} off there first.`);
    const row = await deleteVersioned(OptionGroupRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'option-group.deleted', subjectKind: 'option-group', subjectId: id, summary: `Options ${row.name} deleted` });
    return { id };
  });
