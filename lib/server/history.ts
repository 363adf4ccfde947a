import 'server-only';
import { type Transaction } from 'sequelize';
import { ChangeRow } from '@/models/change';
import { PersonRow } from '@/models/person';
import { SiteRow } from '@/models/site';

export type ChangeRecord = {
  readonly siteId: string;
  /** Null for what Tamis does by itself. */
  readonly personId: string | null;
  /** Stable, for machines: "printer.updated". */
  readonly action: string;
  readonly subjectKind: string;
  readonly subjectId: string | null;
  /** For people: "LARDER 1 renamed to LARDER1". */
  readonly summary: string;
  readonly before?: object;
  readonly after?: object;
};

/** Writes one line of history and moves the site's revision on, in the transaction of the change itself. */
export const recordChange = async (transaction: Transaction, change: ChangeRecord): Promise<void> => {
  await ChangeRow.create({
    siteId: change.siteId, personId: change.personId, at: new Date(), action: change.action, subjectKind: change.subjectKind, subjectId: change.subjectId,
    summary: change.summary.slice(0, 500), beforeValue: change.before ?? null, afterValue: change.after ?? null,
  }, { transaction });
  await SiteRow.increment('revision', { where: { id: change.siteId }, transaction });
};

/** `at` is ISO 8601, UTC. */
export type LastChange = { readonly by: string; readonly at: string; readonly summary: string };

/** Who changed a thing last, and when; null while nobody has. Inside a transaction it sees what others have committed since. */
export const lastChangeOf = async (siteId: string, subjectKind: string, subjectId: string, transaction?: Transaction): Promise<LastChange | null> => {
  const within = { transaction: transaction ?? null, ...(transaction === undefined ? {} : { lock: transaction.LOCK.SHARE }) };
  const row = await ChangeRow.findOne({ where: { siteId, subjectKind, subjectId }, order: [['id', 'DESC']], ...within });
  if (row === null) return null;
  const person = row.personId === null ? null : await PersonRow.findByPk(row.personId, { transaction: transaction ?? null });
  return { by: person?.name ?? 'Tamis', at: row.at.toISOString(), summary: row.summary };
};
