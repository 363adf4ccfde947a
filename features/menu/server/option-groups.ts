import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, updateVersioned } from '@/lib/server/versioned-update';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { OptionRow } from '@/models/option';
import { OptionGroupRow } from '@/models/option-group';
import { RuleRow } from '@/models/rule';
import type { OptionGroupInput } from '../schema';

type Saved = { readonly id: string; readonly version: number };

/** Options keep their ids, so that rules go on speaking of them; one that a rule names cannot be dropped. */
const writeOptions = async (transaction: Transaction, siteId: string, groupId: string, options: OptionGroupInput['options']): Promise<void> => {
  const kept = options.flatMap((option) => (option.id === null ? [] : [option.id]));
  const present = await OptionRow.findAll({ where: { siteId, optionGroupId: groupId }, transaction });
  const dropped = present.filter((row) => !kept.includes(row.id));
  const ruled = await RuleRow.count({ where: { siteId, optionId: dropped.map((row) => row.id) }, transaction });
  if (ruled > 0) throw new AppError('conflict', 'A rule on the board names an option that you took out. Nothing was saved. Take the rule off there first.');
  await OptionRow.destroy({ where: { siteId, id: dropped.map((row) => row.id) }, transaction });
  for (const [position, option] of options.entries()) {
    const values = { name: option.name, kitchenName: option.kitchenName, allergens: [...option.allergens], position };
    const known = option.id !== null && present.some((row) => row.id === option.id);
    if (known) await OptionRow.update(values, { where: { siteId, id: option.id ?? '' }, transaction });
    else await OptionRow.create({ ...values, id: randomUUID(), siteId, optionGroupId: groupId }, { transaction });
  }
};

export const createOptionGroup = (actor: Actor, input: OptionGroupInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const id = randomUUID();
    const position = Number((await OptionGroupRow.max('position', { where: { siteId }, transaction })) ?? -1) + 1;
    await OptionGroupRow.create({ id, siteId, name: input.name, min: input.min, max: input.max, position }, { transaction });
    await writeOptions(transaction, siteId, id, input.options);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'option-group.added', subjectKind: 'option-group', subjectId: id, summary: `Options ${input.name} added` });
    return { id, version: 1 };
  });

export const updateOptionGroup = (actor: Actor, id: string, version: number, input: OptionGroupInput): Promise<Saved> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const row = await updateVersioned(OptionGroupRow, { siteId, id, version }, { name: input.name, min: input.min, max: input.max }, transaction);
    await writeOptions(transaction, siteId, id, input.options);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'option-group.updated', subjectKind: 'option-group', subjectId: id, summary: `Options ${input.name} changed`, after: input });
    return { id, version: row.version };
  });

export const deleteOptionGroup = (actor: Actor, id: string, version: number): Promise<{ readonly id: string }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const used = await ItemOptionGroupRow.count({ where: { siteId, optionGroupId: id }, transaction });
    if (used > 0) throw new AppError('conflict', `${used === 1 ? 'An item comes' : `${used} items come`} with these options. Nothing was deleted. Take the group off ${used === 1 ? 'it' : 'them'} first.`);
    const row = await deleteVersioned(OptionGroupRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'option-group.deleted', subjectKind: 'option-group', subjectId: id, summary: `Options ${row.name} deleted` });
    return { id };
  });
