import 'server-only';
import type { Transaction } from 'sequelize';
import { normaliseMac } from '@/lib/domain/addresses/mac';
import { printerTestsStand, stageWithoutTests } from '@/lib/domain/checks/test-stands';
import { sayPrinterChange } from '@/lib/domain/devices/printer-differences';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import { PrinterRow } from '@/models/printer';
import { PrinterSharedPointRow } from '@/models/printer-shared-point';
import { QueueRow } from '@/models/queue';
import { ReservedAddressRow } from '@/models/reserved-address';
import { isOneOf, refuseBroken, sameName } from './devices-of-site';
import { recordChange } from './history';
import { updateVersioned } from './versioned-update';

/** What the table holds of a printer; a MAC that can be read is kept in one way of writing. */
export const printerValues = (printer: Omit<Printer, 'id' | 'version' | 'downSince' | 'downReason'>) => ({
  name: printer.name, model: printer.model, serial: printer.serial, connection: printer.connection,
  hostTillId: printer.connection === 'network' ? null : printer.hostTill,
  address: printer.address, mask: printer.mask, gateway: printer.gateway, port: printer.port, mac: normaliseMac(printer.mac) ?? printer.mac, presentAddress: printer.presentAddress,
  rollWidthMm: printer.rollWidthMm, columns: printer.columns, codePage: printer.codePage, emphasis: printer.emphasis, cutter: printer.cutter, buzzer: printer.buzzer,
  backupId: printer.backup, joinsStations: printer.joinsStations, stage: printer.stage,
});

export const writePrinterPoints = async (transaction: Transaction, siteId: string, printer: Pick<Printer, 'id' | 'sharedPoints'>): Promise<void> => {
  await PrinterSharedPointRow.destroy({ where: { siteId, printerId: printer.id }, transaction });
  await PrinterSharedPointRow.bulkCreate([...new Set(printer.sharedPoints)].map((sharedPointId) => ({ siteId, printerId: printer.id, sharedPointId })), { transaction });
};

export const mustFitSite = (site: Site, printer: Printer): void => refuseBroken([
  {
    field: 'name', reason: `Another printer is called ${printer.name} already. Tills do not tell capitals from small letters.`,
    broken: site.printers.some((other) => other.id !== printer.id && sameName(other.name, printer.name)),
  },
  { field: 'hostTill', reason: 'This till is no longer on the site. Choose another.', broken: printer.connection !== 'network' && !isOneOf(site.tills, printer.hostTill) },
  { field: 'backup', reason: 'A printer cannot be its own backup. Choose another.', broken: printer.backup === printer.id },
  { field: 'backup', reason: 'This printer is no longer on the site. Choose another.', broken: !isOneOf(site.printers, printer.backup) },
  { field: 'sharedPoints', reason: 'One of these is no longer on the site. Choose again.', broken: !printer.sharedPoints.every((point) => isOneOf(site.sharedPoints, point)) },
]);

/** An address reserved in the printer's old name stays its own under the new one. */
const renameReservations = async (transaction: Transaction, siteId: string, from: string, to: string): Promise<void> => {
  const rows = await ReservedAddressRow.findAll({ where: { siteId }, transaction });
  for (const row of rows) {
    if (row.reason !== from && !row.reason.startsWith(`${from},`)) continue;
    await row.update({ reason: `${to}${row.reason.slice(from.length)}`.slice(0, 200) }, { transaction });
  }
};

/** A printer that somebody moved or replaced is no further than having its address, unless they say otherwise. */
const stageAfter = (before: Printer, after: Printer): Printer['stage'] =>
  (printerTestsStand(before, after) || after.stage !== before.stage ? after.stage : stageWithoutTests(after.stage));

export type PrinterWrite = {
  readonly site: Site;
  readonly personId: string;
  readonly before: Printer;
  readonly after: Printer;
  /** The version the change was made from. */
  readonly version: number;
};

/** Writes a printer as it is to be. Tests that were printed on what it was before do not count for what it is now. */
export const writePrinter = async (transaction: Transaction, { site, personId, before, after, version }: PrinterWrite): Promise<{ readonly id: string; readonly version: number }> => {
  const siteId = site.id;
  if (before.version === version) mustFitSite(site, after);
  const row = await updateVersioned(PrinterRow, { siteId, id: before.id, version }, { ...printerValues(after), stage: stageAfter(before, after) }, transaction);
  await writePrinterPoints(transaction, siteId, after);
  if (!printerTestsStand(before, after)) await QueueRow.update({ testPrintedAt: null }, { where: { siteId, printerId: before.id }, transaction });
  if (before.name !== after.name) await renameReservations(transaction, siteId, before.name, after.name);
  await recordChange(transaction, { siteId, personId, action: 'printer.updated', subjectKind: 'printer', subjectId: before.id, summary: sayPrinterChange(before, after, site), before, after });
  return { id: before.id, version: row.version };
};
