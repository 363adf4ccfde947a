import 'server-only';
import type { Transaction } from 'sequelize';
import type { ItemFields, ItemNaming } from '@/lib/domain/menu/item-differences';
import { refuseBroken } from '@/lib/server/devices-of-site';
import { CourseRow } from '@/models/course';
import { ItemRow } from '@/models/item';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { OptionGroupRow } from '@/models/option-group';
import { SectionRow } from '@/models/section';

/** What the table holds of an item; its option groups have a table of their own. */
export const itemValues = (item: ItemFields) => ({
  sectionId: item.section, name: item.name, kitchenName: item.kitchenName, allergens: [...item.allergens], courseId: item.course,
  preparationSeconds: item.preparationSeconds, soldOut: item.soldOut, left: item.left, noTicket: item.noTicket,
});

export const fieldsOfRow = (row: ItemRow, optionGroups: readonly string[]): ItemFields => ({
  section: row.sectionId, name: row.name, kitchenName: row.kitchenName, allergens: row.allergens, course: row.courseId, preparationSeconds: row.preparationSeconds,
  soldOut: row.soldOut, left: row.left, noTicket: row.noTicket, optionGroups,
});

export const readItemGroups = async (transaction: Transaction, siteId: string, itemId: string): Promise<readonly string[]> =>
  (await ItemOptionGroupRow.findAll({ where: { siteId, itemId }, order: ['position'], transaction })).map((row) => row.optionGroupId);

export const writeItemGroups = async (transaction: Transaction, siteId: string, itemId: string, groups: readonly string[]): Promise<void> => {
  await ItemOptionGroupRow.destroy({ where: { siteId, itemId }, transaction });
  await ItemOptionGroupRow.bulkCreate([...new Set(groups)].map((optionGroupId, position) => ({ siteId, itemId, position, optionGroupId })), { transaction });
};

/** Refuses a name that its menu section has already, in words: the table's own refusal would quote a key. */
export const mustHaveFreeName = async (transaction: Transaction, siteId: string, id: string | null, { section, name }: Pick<ItemFields, 'section' | 'name'>): Promise<void> => {
  const taken = await ItemRow.findOne({ where: { siteId, sectionId: section, name }, transaction });
  if (taken === null || taken.id === id) return;
  const heading = await SectionRow.findOne({ where: { siteId, id: section }, transaction });
  refuseBroken([{ field: 'name', broken: true, reason: `${heading?.name ?? 'This menu section'} has “${taken.name}” already.` }]);
};

/** Names for one line of history. */
export const itemNaming = async (transaction: Transaction, siteId: string): Promise<ItemNaming> => {
  const within = { where: { siteId }, attributes: ['id', 'name'], transaction };
  const [sections, courses, groups] = await Promise.all([SectionRow.findAll(within), CourseRow.findAll(within), OptionGroupRow.findAll(within)]);
  return { sections, courses, groups };
};
