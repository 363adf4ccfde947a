import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import type { Menu } from '@/lib/domain/site/menu';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { ItemRow } from '@/models/item';
import { OptionRow } from '@/models/option';
import { OptionGroupRow } from '@/models/option-group';
import { SectionRow } from '@/models/section';
import { groupRows, type Within } from './group-rows';

export const loadMenu = async (within: Within): Promise<Menu> => {
  const [sections, items, groupsOfItems, groups, options] = await Promise.all([
    SectionRow.findAll({ ...within, order: ['position', 'name'] }),
    ItemRow.findAll({ ...within, order: ['position', 'name'] }),
    ItemOptionGroupRow.findAll({ ...within, order: ['itemId', 'position'] }),
    OptionGroupRow.findAll({ ...within, order: ['position', 'name'] }),
    OptionRow.findAll({ ...within, order: ['position', 'name'] }),
  ]);
  const groupsOf = groupRows(groupsOfItems, (row) => row.itemId);
  const optionsOf = groupRows(options, (row) => row.optionGroupId);
  const itemsOf = groupRows(items, (row) => row.sectionId);
  return {
    sections: sections.map((row) => ({ id: asId(row.id), name: row.name, position: row.position, version: row.version })),
    items: sections.flatMap((section) => itemsOf(section.id)).map((row) => ({
      id: asId(row.id), section: asId(row.sectionId), name: row.name, kitchenName: row.kitchenName, allergens: row.allergens,
      course: row.courseId === null ? null : asId(row.courseId), preparationSeconds: row.preparationSeconds, soldOut: row.soldOut, left: row.left,
      noTicket: row.noTicket, optionGroups: groupsOf(row.id).map((one) => asId(one.optionGroupId)), position: row.position, version: row.version,
    })),
    optionGroups: groups.map((row) => ({ id: asId(row.id), name: row.name, min: row.min, max: row.max, options: optionsOf(row.id).map((one) => asId(one.id)), version: row.version })),
    options: groups.flatMap((group) => optionsOf(group.id)).map((row) => ({
      id: asId(row.id), group: asId(row.optionGroupId), name: row.name, kitchenName: row.kitchenName, allergens: row.allergens, position: row.position, version: row.version,
    })),
  };
};
