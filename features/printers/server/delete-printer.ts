import 'server-only';
import { dependentsOfPrinter } from '@/lib/domain/checks/dependents';
import { asId } from '@/lib/domain/site/ids';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned } from '@/lib/server/versioned-update';
import { PrinterRow } from '@/models/printer';
import { StationRow } from '@/models/station';
import { StationPrinterRow } from '@/models/station-printer';
import { TillRow } from '@/models/till';
import { readPrinter } from '@/lib/server/devices-of-site';

/** Takes a printer off the list, and out of every list that names it; what that costs goes into the history. */
export const deletePrinter = (actor: Actor, { printer: id, version }: { readonly printer: string; readonly version: number }): Promise<{ readonly id: string }> =>
  actIn(actor, 'printer.write', async (transaction) => {
    const { siteId } = actor;
    const { site, printer } = await readPrinter(transaction, siteId, id);
    const { consequences } = dependentsOfPrinter(site, asId(id));
    await PrinterRow.increment('version', { where: { siteId, backupId: id }, transaction });
    await PrinterRow.update({ backupId: null }, { where: { siteId, backupId: id }, transaction });
    const tills = site.tills.filter((till) => till.defaultPrinter === id || till.queues.some((queue) => queue.printer === id)).map((till) => till.id);
    await TillRow.increment('version', { where: { siteId, id: tills }, transaction });
    await TillRow.update({ defaultPrinterId: null }, { where: { siteId, defaultPrinterId: id }, transaction });
    const stations = site.stations.filter((station) => station.printers.includes(asId(id))).map((station) => station.id);
    await StationRow.increment('version', { where: { siteId, id: stations }, transaction });
    await StationPrinterRow.destroy({ where: { siteId, printerId: id }, transaction });
    await deleteVersioned(PrinterRow, { siteId, id, version }, transaction);
    await recordChange(transaction, {
      siteId, personId: actor.person.id, action: 'printer.deleted', subjectKind: 'printer', subjectId: id,
      summary: [`${printer.name} taken off the list.`, ...consequences].join(' '), before: printer,
    });
    return { id };
  });
