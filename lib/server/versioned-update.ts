import 'server-only';
import type { Model, ModelStatic, Transaction } from 'sequelize';

/** Someone else wrote the row since it was read: what it holds now goes back with the refusal. */
export class StaleWrite extends Error {
  override readonly name = 'StaleWrite';
  constructor(
    readonly subjectKind: string,
    readonly subjectId: string,
    /** The row as it is now. */
    readonly current: Readonly<Record<string, unknown>>,
    readonly version: number,
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

/**
 * Writes a row if it still has the version it was read at, and raises the version by one. The check and the write are one
 * statement, so that of two people exactly one is refused.
 */
export const updateVersioned = async <Row extends Versioned>(model: ModelStatic<Row>, key: RowKey, values: object, transaction: Transaction): Promise<Row> => {
  const kind = model.name.replace(/Row$/, '').replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
  const where = { siteId: key.siteId, id: key.id, version: key.version } as never;
  const [count] = await model.update({ ...values, version: key.version + 1 } as never, { where, transaction });
  const current = await model.findOne({ where: { siteId: key.siteId, id: key.id } as never, transaction });
  if (current === null) throw new RowMissing(kind, key.id);
  if (count === 0) throw new StaleWrite(kind, key.id, current.get({ plain: true }) as Record<string, unknown>, current.version);
  return current;
};

/** Deletes a row if it still has the version it was read at. */
export const deleteVersioned = async <Row extends Versioned>(model: ModelStatic<Row>, key: RowKey, transaction: Transaction): Promise<Row> => {
  const kind = model.name.replace(/Row$/, '').replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
  const current = await model.findOne({ where: { siteId: key.siteId, id: key.id } as never, transaction, lock: transaction.LOCK.UPDATE });
  if (current === null) throw new RowMissing(kind, key.id);
  if (current.version !== key.version) throw new StaleWrite(kind, key.id, current.get({ plain: true }) as Record<string, unknown>, current.version);
  await current.destroy({ transaction });
  return current;
};
