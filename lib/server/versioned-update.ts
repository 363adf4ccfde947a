import 'server-only';
import type { Model, ModelStatic, Transaction } from 'sequelize';
import { lastChangeOf, type LastChange } from './history';

/** Someone else wrote the row since it was read: what it holds now goes back with the refusal. */
export class StaleWrite extends Error {
  override readonly name = 'StaleWrite';
  constructor(
    readonly subjectKind: string,
    readonly subjectId: string,
    /** The row as it is now. */
    readonly current: Readonly<Record<string, unknown>>,
    readonly version: number,
    /** Who changed it last, when, and in which words; null while nobody has. */
    readonly lastChange: LastChange | null,
  ) {
    super(`${subjectKind} ${subjectId} was changed by somebody else; it is at version ${version}.`);
  }
}

export class RowMissing extends Error {
  override readonly name = 'RowMissing';
  constructor(readonly subjectKind: string, readonly subjectId: string) {
    super(`There is no ${subjectKind} ${subjectId} on this site.`);
  }
}

type Versioned = Model & { readonly version: number };

export type RowKey = { readonly siteId: string; readonly id: string; readonly version: number };

/** The table "option_groups" holds what history calls an "option-group". A class's name would not do: a build shortens it. */
const kindOf = (model: ModelStatic<Versioned>): string => model.tableName.replace(/s$/, '').replaceAll('_', '-');

/** A site's own row has no site beside it. */
const rowAt = (model: ModelStatic<Versioned>, { siteId, id }: Pick<RowKey, 'siteId' | 'id'>): object => ('siteId' in model.getAttributes() ? { siteId, id } : { id });

/** The row as it stands now, locked: a plain read would repeat what this transaction saw at its start. */
const lockedRow = async <Row extends Versioned>(model: ModelStatic<Row>, key: RowKey, transaction: Transaction): Promise<Row> => {
  const row = await model.findOne({ where: rowAt(model, key) as never, transaction, lock: transaction.LOCK.UPDATE });
  if (row === null) throw new RowMissing(kindOf(model), key.id);
  return row;
};

const refusal = async (model: ModelStatic<Versioned>, { siteId, id }: RowKey, current: Versioned, transaction: Transaction): Promise<StaleWrite> => {
  const kind = kindOf(model);
  return new StaleWrite(kind, id, current.get({ plain: true }) as Record<string, unknown>, current.version, await lastChangeOf(siteId, kind, id, transaction));
};

/**
 * Writes a row if it still has the version it was read at, and raises the version by one. The check and the write are one
 * statement, so that of two people exactly one is refused.
 */
export const updateVersioned = async <Row extends Versioned>(model: ModelStatic<Row>, key: RowKey, values: object, transaction: Transaction): Promise<Row> => {
  const where = { ...rowAt(model, key), version: key.version } as never;
  const [count] = await model.update({ ...values, version: key.version + 1 } as never, { where, transaction });
  const current = await lockedRow(model, key, transaction);
  if (count === 0) throw await refusal(model, key, current, transaction);
  return current;
};

/** Deletes a row if it still has the version it was read at. */
export const deleteVersioned = async <Row extends Versioned>(model: ModelStatic<Row>, key: RowKey, transaction: Transaction): Promise<Row> => {
  const current = await lockedRow(model, key, transaction);
  if (current.version !== key.version) throw await refusal(model, key, current, transaction);
  await current.destroy({ transaction });
  return current;
};
