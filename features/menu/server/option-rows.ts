import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { refuseBroken, sameName } from '@/lib/server/devices-of-site';
import { OptionRow } from '@/models/option';
import { OptionGroupRow } from '@/models/option-group';
import { RuleRow } from '@/models/rule';
import type { OptionGroupInput } from '../schema';

/** Refuses in words what the tables would refuse with a key. */
export const mustFitMenu = async (transaction: Transaction, siteId: string, id: string | null, { name, options }: OptionGroupInput): Promise<void> => {
  const taken = await OptionGroupRow.findOne({ where: { siteId, name }, transaction });
  const twice = options.findIndex((option, index) => options.findIndex((other) => sameName(other.name, option.name)) < index);
  refuseBroken([
    { field: 'name', broken: taken !== null && taken.id !== id, reason: `There is a group called “${taken?.name ?? name}” already.` },
    { field: `options.${twice}.name`, broken: twice >= 0, reason: `“${options[twice]?.name ?? ''}” stands twice in this group.` },
  ]);
};

const dropOptions = async (transaction: Transaction, siteId: string, dropped: readonly OptionRow[]): Promise<void> => {
  const ids = dropped.map((row) => row.id);
  const [ruled] = await RuleRow.findAll({ where: { siteId, optionId: ids }, transaction });
  const name = dropped.find((row) => row.id === ruled?.optionId)?.name;
  if (ruled !== undefined) throw new AppError('conflict', `A rule on the board names ${name ?? 'an option'}, which you took out. Nothing was saved. Take the rule off there first.`);
  await OptionRow.destroy({ where: { siteId, id: ids }, transaction });
};

/** Options keep their ids, so that rules go on speaking of them; one that a rule names cannot be dropped. */
export const writeOptions = async (transaction: Transaction, siteId: string, groupId: string, options: OptionGroupInput['options']): Promise<void> => {
  const present = await OptionRow.findAll({ where: { siteId, optionGroupId: groupId }, transaction });
  const kept = new Set(options.flatMap((option) => (option.id === null ? [] : [option.id])));
  await dropOptions(transaction, siteId, present.filter((row) => !kept.has(row.id)));
  // Two options may have swapped their names: the names are made apart first.
  for (const row of present.filter((one) => kept.has(one.id))) await OptionRow.update({ name: row.id }, { where: { siteId, id: row.id }, transaction });
  for (const [position, option] of options.entries()) {
    const values = { name: option.name, kitchenName: option.kitchenName, allergens: [...option.allergens], position };
    const known = present.find((row) => row.id === option.id);
    if (known === undefined) await OptionRow.create({ ...values, id: randomUUID(), siteId, optionGroupId: groupId }, { transaction });
    else await OptionRow.update({ ...values, version: known.version + 1 }, { where: { siteId, id: known.id }, transaction });
  }
};
