import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { PrinterRow } from '@/models/printer';
import type { PrinterDownInput } from '../schema';
import { readPrinter } from '@/lib/server/devices-of-site';

/**
 * Marks a printer down with the reason, or up again. It names no version: whoever stands in front of the printer is
 * right, whatever was being edited.
 */
export const markPrinter = (actor: Actor, { printer: id, down, reason }: PrinterDownInput & { readonly printer: string }, now = new Date()): Promise<{ readonly id: string }> =>
  actIn(actor, 'printer.mark-down', async (transaction) => {
    const { siteId } = actor;
    const { printer } = await readPrinter(transaction, siteId, id);
    const since = down ? printer.downSince ?? now.toISOString() : null;
    await PrinterRow.update({ downSince: since === null ? null : new Date(since), downReason: down ? reason : '' }, { where: { siteId, id }, transaction });
    await PrinterRow.increment('version', { where: { siteId, id }, transaction });
    await recordChange(transaction, {
      siteId, personId: actor.person.id, action: down ? 'printer.down' : 'printer.up', subjectKind: 'printer', subjectId: id,
      summary: down ? `${printer.name} is down${reason === '' ? '' : `: ${reason}`}` : `${printer.name} is up again`,
    });
    return { id };
  });
