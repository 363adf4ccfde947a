import 'server-only';
import type { Transaction } from 'sequelize';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Till } from '@/lib/domain/site/till';
import { AppError, type FieldReason } from '@/lib/http/errors';
import { loadSite } from './site-snapshot';

const gone = (what: string): AppError => new AppError('not-found', `This ${what} is no longer on the site; somebody has taken it off the list. Nothing was changed.`);

/** The site as it is inside this transaction. */
export const readSite = async (transaction: Transaction, siteId: string): Promise<Site> => {
  const site = await loadSite(siteId, transaction);
  if (site === null) throw gone('site');
  return site;
};

export const readPrinter = async (transaction: Transaction, siteId: string, printerId: string): Promise<{ readonly site: Site; readonly printer: Printer }> => {
  const site = await readSite(transaction, siteId);
  const printer = site.printers.find((one) => one.id === printerId);
  if (printer === undefined) throw gone('printer');
  return { site, printer };
};

export const readTill = async (transaction: Transaction, siteId: string, tillId: string): Promise<{ readonly site: Site; readonly till: Till }> => {
  const site = await readSite(transaction, siteId);
  const till = site.tills.find((one) => one.id === tillId);
  if (till === undefined) throw gone('till');
  return { site, till };
};

type Rule = FieldReason & { readonly broken: boolean };

/** Refuses what the tables would refuse, each reason on the field it is about. */
export const refuseBroken = (rules: readonly Rule[]): void => {
  const fields = rules.filter((rule) => rule.broken).map(({ field, reason }) => ({ field, reason }));
  const [first] = fields;
  if (first !== undefined) throw new AppError('invalid', `${first.reason} Nothing was saved.`, { fields });
};

export const isOneOf = (rows: readonly { readonly id: string }[], wanted: string | null): boolean => wanted === null || rows.some((row) => row.id === wanted);

/** Names that a table takes for one: without case, and without space at the end. */
export const sameName = (left: string, right: string): boolean => {
  const fold = (name: string): string => name.normalize('NFC').trimEnd().toLowerCase();
  return fold(left) === fold(right);
};
