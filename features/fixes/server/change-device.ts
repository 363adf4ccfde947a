import 'server-only';
import type { Transaction } from 'sequelize';
import type { Printer } from '@/lib/domain/site/printer';
import type { Till } from '@/lib/domain/site/till';
import { readPrinter, readTill } from '@/lib/server/devices-of-site';
import { writePrinter } from '@/lib/server/printer-store';
import { writeTill } from '@/lib/server/till-store';

/** Who presses, and where. */
export type By = { readonly siteId: string; readonly personId: string };

export const changePrinter = async (transaction: Transaction, { siteId, personId }: By, id: string, change: (printer: Printer) => Printer): Promise<void> => {
  const { site, printer: before } = await readPrinter(transaction, siteId, id);
  await writePrinter(transaction, { site, personId, before, after: change(before), version: before.version });
};

export const changeTill = async (transaction: Transaction, { siteId, personId }: By, id: string, change: (till: Till) => Till): Promise<void> => {
  const { site, till: before } = await readTill(transaction, siteId, id);
  await writeTill(transaction, { site, personId, before, after: change(before), version: before.version });
};
