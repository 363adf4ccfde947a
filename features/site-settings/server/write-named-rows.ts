import 'server-only';
import { randomUUID } from 'node:crypto';
import type { CreationAttributes, Model, ModelStatic, Transaction } from 'sequelize';
import { refuseBroken, sameName } from '@/lib/server/devices-of-site';

type NamedRow = { readonly id: string; readonly name: string };

type NamedRowsWrite<Row extends NamedRow> = {
  readonly siteId: string;
  /** Name of the form's list, for reasons on its fields. */
  readonly list: string;
  readonly before: readonly NamedRow[];
  /** In their new order; an empty id is a row that is not there yet. */
  readonly after: readonly Row[];
};

const mustBeListable = ({ list, before, after }: NamedRowsWrite<NamedRow>): void => refuseBroken(after.flatMap((row, index) => [
  { field: `${list}.${index}.name`, reason: `${row.name} stands in the list twice.`, broken: after.slice(0, index).some((other) => sameName(other.name, row.name)) },
  { field: `${list}.${index}.name`, reason: `${row.name} is no longer on the site. Take the line off, or add it as a new one.`, broken: row.id !== '' && !before.some(({ id }) => id === row.id) },
  { field: `${list}.${index}.name`, reason: `${row.name} stands in the list twice.`, broken: row.id !== '' && after.slice(0, index).some(({ id }) => id === row.id) },
]));

/** Makes a site's rows what the list says: what is missing goes, what is new comes, names and places change. */
export const writeNamedRows = async <Row extends NamedRow>(transaction: Transaction, model: ModelStatic<Model>, write: NamedRowsWrite<Row>): Promise<void> => {
  mustBeListable(write);
  const { siteId, before, after } = write;
  const gone = before.filter(({ id }) => !after.some((row) => row.id === id)).map(({ id }) => id);
  await model.destroy({ where: { siteId, id: gone }, transaction });
  // Two rows that swap their names would meet halfway, and the table takes no two of one name.
  for (const { id, name } of before) {
    const renamed = after.find((row) => row.id === id && row.name !== name);
    if (renamed !== undefined) await model.update({ name: `~${id}` }, { where: { siteId, id }, transaction });
  }
  for (const [position, row] of after.entries()) {
    if (row.id === '') await model.create({ ...row, id: randomUUID(), siteId, position } as CreationAttributes<Model>, { transaction });
    else await model.update({ ...row, position }, { where: { siteId, id: row.id }, transaction });
  }
};
