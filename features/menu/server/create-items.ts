import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { ItemRow } from '@/models/item';
import type { ItemInput } from '../schema';
import { itemValues, mustHaveFreeName, writeItemGroups } from './item-row';

export type Saved = { readonly id: string; readonly version: number };

/** Writes items at the end of the menu's order, which is the end of each one's section. */
export const insertItems = async (transaction: Transaction, siteId: string, items: readonly ItemInput[]): Promise<readonly Saved[]> => {
  let position = Number((await ItemRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
  const saved: Saved[] = [];
  for (const input of items) {
    const id = randomUUID();
    await mustHaveFreeName(transaction, siteId, null, input);
    await ItemRow.create({ ...itemValues(input), id, siteId, position }, { transaction });
    await writeItemGroups(transaction, siteId, id, input.optionGroups);
    saved.push({ id, version: 1 });
    position += 1;
  }
  return saved;
};

/** Adds lines at the end of their sections: all of them, or none when one is refused. */
export const createItems = (actor: Actor, items: readonly ItemInput[]): Promise<{ readonly items: readonly Saved[] }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const saved = await insertItems(transaction, siteId, items);
    const summary = items.length === 1 ? `${items[0]?.name ?? 'An item'} added to the menu` : `${items.length} items added to the menu`;
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.added', subjectKind: 'item', subjectId: saved[0]?.id ?? null, summary });
    return { items: saved };
  });
