import 'server-only';
import { actIn, type Actor } from '@/lib/server/actor';
import { readPrinter } from '@/lib/server/devices-of-site';
import { writePrinter } from '@/lib/server/printer-store';
import { printerOfInput } from '../printer-of-input';
import type { PrinterInput } from '../schema';

export type PrinterUpdate = { readonly printer: string; readonly version: number; readonly input: PrinterInput };

/** Saves a printer as a person wrote it, unless somebody else saved it since. */
export const updatePrinter = (actor: Actor, { printer: id, version, input }: PrinterUpdate): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'printer.write', async (transaction) => {
    const { site, printer: before } = await readPrinter(transaction, actor.siteId, id);
    const after = printerOfInput(input, id, before);
    return writePrinter(transaction, { site, personId: actor.person.id, before, after, version });
  });
