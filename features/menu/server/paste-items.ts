import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { ItemRow } from '@/models/item';
import type { PasteInput } from '../schema';
import { insertItems, type Saved } from './create-items';
import { itemNaming } from './item-row';
import { writeItem } from './update-item';

export type Pasted = { readonly updates: readonly Saved[]; readonly creates: readonly Saved[] };

/**
 * Lays many lines over the menu at once: those that are there against their versions, the rest as new ones. All of it or
 * nothing, and two lines may swap their names.
 */
export const pasteItems = (actor: Actor, { updates, creates }: PasteInput): Promise<Pasted> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const rows = await ItemRow.findAll({ where: { siteId, id: updates.map((update) => update.id) }, transaction });
    const renamed = updates.filter(({ id, item }) => rows.some((row) => row.id === id && row.name !== item.name));
    if (renamed.length > 1) for (const { id } of renamed) await ItemRow.update({ name: id }, { where: { siteId, id }, transaction });
    const naming = await itemNaming(transaction, siteId);
    const saved: Saved[] = [];
    for (const { id, version, item } of updates) {
      const { summary, ...one } = await writeItem(transaction, siteId, { item: id, version, input: item }, naming);
      saved.push(one);
      await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.updated', subjectKind: 'item', subjectId: id, summary, after: item });
    }
    const added = await insertItems(transaction, siteId, creates);
    if (creates.length > 0) {
      const summary = `${creates.length === 1 ? creates[0]?.name ?? 'An item' : `${creates.length} items`} added to the menu`;
      await recordChange(transaction, { siteId, personId: actor.person.id, action: 'item.added', subjectKind: 'item', subjectId: added[0]?.id ?? null, summary });
    }
    return { updates: saved, creates: added };
  });
