import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import { actIn, type Actor } from '@/lib/server/actor';
import { readPrinter } from '@/lib/server/devices-of-site';
import { writePrinter } from '@/lib/server/printer-store';

/** Says which printer takes over, or that none does. It is one field and a chef's to set, so it asks for no version. */
export const setBackup = (actor: Actor, { printer: id, backup }: { readonly printer: string; readonly backup: string | null }): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'printer.set-backup', async (transaction) => {
    const { site, printer: before } = await readPrinter(transaction, actor.siteId, id);
    const after = { ...before, backup: backup === null ? null : asId<typeof before.id>(backup) };
    return writePrinter(transaction, { site, personId: actor.person.id, before, after, version: before.version });
  });
