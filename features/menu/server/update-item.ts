import 'server-only';
import type { Transaction } from 'sequelize';
import { sayItemChange, type ItemNaming } from '@/lib/domain/menu/item-differences';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { RowMissing, updateVersioned } from '@/lib/server/versioned-update';
import { ItemRow } from '@/models/item';
import type { ItemInput } from '../schema';
import type { Saved } from './create-items';
import { fieldsOfRow, itemNaming, itemValues, mustHaveFreeName, readItemGroups, writeItemGroups } from './item-row';

export type ItemUpdate = { readonly item: string; readonly version: number; readonly input: ItemInput };

/** Writes one item against its version, and gives the line of history that says what changed. */
export const writeItem = async (transaction: Transaction, siteId: string, { item: id, version, input }: ItemUpdate, naming: ItemNaming): Promise<Saved & { readonly summary: string }> => {
  const row = await ItemRow.findOne({ where: { siteId, id }, transaction });
  if (row === null) throw new RowMissing('item', id);
  const before = fieldsOfRow(row, await readItemGroups(transaction, siteId, id));
  if (row.version === version) await mustHaveFreeName(transaction, siteId, id, input);
  const after = await updateVersioned(ItemRow, { siteId, id, version }, itemValues(input), transaction);
  await writeItemGroups(transaction, siteId, id, input.optionGroups);
  return { id, version: after.version, summary: sayItemChange(before, input, naming) };
};

/** Saves an item as a person wrote it, unless somebody else saved it since. */
export const updateItem = (actor: Actor, update: ItemUpdate): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const { id, version, summary } = await writeItem(transaction, siteId, update, await itemNaming(transaction, siteId));
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.updated', subjectKind: 'item', subjectId: id, summary, after: update.input });
    return { id, version };
  });
