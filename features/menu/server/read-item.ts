import 'server-only';
import type { ItemFields } from '@/lib/domain/menu/item-differences';
import { actIn, type Actor } from '@/lib/server/actor';
import { RowMissing } from '@/lib/server/versioned-update';
import { ItemRow } from '@/models/item';
import { fieldsOfRow, readItemGroups } from './item-row';

/** One item as it is now, for somebody who was told that another person changed it. */
export const readItem = (actor: Actor, id: string): Promise<{ readonly id: string; readonly version: number; readonly item: ItemFields }> =>
  actIn(actor, 'site.read', async (transaction) => {
    const { siteId } = actor;
    const row = await ItemRow.findOne({ where: { siteId, id }, transaction });
    if (row === null) throw new RowMissing('item', id);
    return { id, version: row.version, item: fieldsOfRow(row, await readItemGroups(transaction, siteId, id)) };
  });
