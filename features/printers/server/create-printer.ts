import 'server-only';
import { randomUUID } from 'node:crypto';
import { actIn, type Actor } from '@/lib/server/actor';
import { readSite } from '@/lib/server/devices-of-site';
import { recordChange } from '@/lib/server/history';
import { mustFitSite, printerValues, writePrinterPoints } from '@/lib/server/printer-store';
import { PrinterRow } from '@/models/printer';
import { printerOfInput } from '../printer-of-input';
import type { PrinterInput } from '../schema';

/** Writes down a printer that the site has got, last in its list. */
export const createPrinter = (actor: Actor, input: PrinterInput): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'printer.write', async (transaction) => {
    const { siteId } = actor;
    const site = await readSite(transaction, siteId);
    const id = randomUUID();
    const printer = printerOfInput(input, id, null);
    mustFitSite(site, printer);
    const position = Number((await PrinterRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    await PrinterRow.create({ ...printerValues(printer), id, siteId, position, downReason: '' }, { transaction });
    await writePrinterPoints(transaction, siteId, printer);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'printer.added', subjectKind: 'printer', subjectId: id, summary: `${printer.name} added`, after: printer });
    return { id, version: 1 };
  });
