import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, updateVersioned } from '@/lib/server/versioned-update';
import { ItemRow } from '@/models/item';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { RuleRow } from '@/models/rule';
import type { ItemInput } from '../schema';

type Saved = { readonly id: string; readonly version: number };

const rowOf = (input: ItemInput) => ({
  sectionId: input.section, name: input.name, kitchenName: input.kitchenName, allergens: [...input.allergens], courseId: input.course,
  preparationSeconds: input.preparationSeconds, soldOut: input.soldOut, left: input.left, noTicket: input.noTicket,
});

const writeGroups = async (transaction: Transaction, siteId: string, itemId: string, groups: readonly string[]): Promise<void> => {
  await ItemOptionGroupRow.destroy({ where: { siteId, itemId }, transaction });
  await ItemOptionGroupRow.bulkCreate([...new Set(groups)].map((optionGroupId, position) => ({ siteId, itemId, position, optionGroupId })), { transaction });
};

/** Adds lines at the end of their sections: all of them, or none when one is refused. */
export const createItems = (actor: Actor, items: readonly ItemInput[]): Promise<{ readonly items: readonly Saved[] }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    let position = Number((await ItemRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    const saved: Saved[] = [];
    for (const input of items) {
      const id = randomUUID();
      await ItemRow.create({ ...rowOf(input), id, siteId, position }, { transaction });
      await writeGroups(transaction, siteId, id, input.optionGroups);
      saved.push({ id, version: 1 });
      position += 1;
    }
    const [first] = items;
    const summary = items.length === 1 ? `${first?.name ?? 'An item'} added to the menu` : `${items.length} items added to the menu`;
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.added', subjectKind: 'item', subjectId: saved[0]?.id ?? null, summary });
    return { items: saved };
  });

export const updateItem = (actor: Actor, id: string, version: number, input: ItemInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const row = await updateVersioned(ItemRow, { siteId, id, version }, rowOf(input), transaction);
    await writeGroups(transaction, siteId, id, input.optionGroups);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.updated', subjectKind: 'item', subjectId: id, summary: `${input.name} changed on the menu`, after: input });
    return { id, version: row.version };
  });

/** An item that a rule names stays until the rule is gone, so that no plan loses a rule unseen. */
export const deleteItem = (actor: Actor, id: string, version: number): Promise<{ readonly id: string }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const rules = await RuleRow.count({ where: { siteId, itemId: id }, transaction });
    if (rules > 0) throw new AppError('conflict', `${rules === 1 ? 'A rule' : `${rules} rules`} on the board ${rules === 1 ? 'names' : 'name'} this item. Nothing was deleted. Take ${rules === 1 ? 'it' : 'them'} off there first, or mark the item as sold out.`);
    const row = await deleteVersioned(ItemRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.deleted', subjectKind: 'item', subjectId: id, summary: `${row.name} taken off the menu` });
    return { id };
  });

export const orderItems = (actor: Actor, ids: readonly string[]): Promise<{ readonly ordered: number }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const rows = await ItemRow.findAll({ where: { siteId, id: [...ids] }, transaction });
    const places = rows.map((row) => row.position).toSorted((left, right) => left - right);
    for (const [index, id] of ids.entries()) await ItemRow.update({ position: places[index] ?? index }, { where: { siteId, id }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.ordered', subjectKind: 'site', subjectId: null, summary: 'Items put in another order' });
    return { ordered: ids.length };
  });
