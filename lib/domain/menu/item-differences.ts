import type { Allergen } from '../site/menu';

/** What a person sets of an item, whatever its ids are typed as. */
export type ItemFields = {
  readonly section: string;
  readonly name: string;
  readonly kitchenName: string;
  readonly allergens: readonly Allergen[];
  readonly course: string | null;
  readonly preparationSeconds: number | null;
  readonly soldOut: boolean;
  readonly left: number | null;
  readonly noTicket: boolean;
  readonly optionGroups: readonly string[];
};
export type ItemField = keyof ItemFields;

export const itemFieldWords: Readonly<Record<ItemField, string>> = {
  section: 'Menu section', name: 'Name', kitchenName: 'Kitchen name', course: 'Course', allergens: 'Allergens', optionGroups: 'Options', preparationSeconds: 'Seconds', left: 'Left',
  soldOut: 'Sold out', noTicket: 'No ticket',
};

type Named = { readonly id: string; readonly name: string };
/** Where the names of what an item refers to are found. */
export type ItemNaming = { readonly sections: readonly Named[]; readonly courses: readonly Named[]; readonly groups: readonly Named[] };
export type ItemDifference = { readonly field: ItemField; readonly label: string; readonly from: string; readonly to: string };

const nameIn = (rows: readonly Named[], id: string): string => rows.find((row) => row.id === id)?.name ?? 'one that is gone';

const sayValue = (item: ItemFields, field: ItemField, naming: ItemNaming): string => {
  switch (field) {
    case 'section': return nameIn(naming.sections, item.section);
    case 'course': return item.course === null ? 'none' : nameIn(naming.courses, item.course);
    case 'allergens': return item.allergens.join(', ') || 'none';
    case 'optionGroups': return item.optionGroups.map((group) => nameIn(naming.groups, group)).join(', ') || 'none';
    case 'preparationSeconds': case 'left': return item[field] === null ? 'nothing' : String(item[field]);
    case 'soldOut': case 'noTicket': return item[field] ? 'yes' : 'no';
    default: return item[field] || 'nothing';
  }
};

const fields = Object.keys(itemFieldWords) as readonly ItemField[];

/** Allergens are a set; option groups are asked in their order. */
const sameValue = (field: ItemField, left: ItemFields, right: ItemFields): boolean => {
  if (field === 'allergens') return left.allergens.toSorted().join() === right.allergens.toSorted().join();
  return field === 'optionGroups' ? left.optionGroups.join('\n') === right.optionGroups.join('\n') : left[field] === right[field];
};

/** The fields in which two states of one item differ. */
export const changedItemFields = (from: ItemFields, to: ItemFields): readonly ItemField[] => fields.filter((field) => !sameValue(field, from, to));

export const itemDifferences = (from: ItemFields, to: ItemFields, naming: ItemNaming): readonly ItemDifference[] =>
  changedItemFields(from, to).map((field) => ({ field, label: itemFieldWords[field], from: sayValue(from, field, naming), to: sayValue(to, field, naming) }));

/** What one person changed from `base`, put on top of what another made of it meanwhile. */
export const mergeItem = <Item extends ItemFields>(base: Item, mine: Item, theirs: Item): Item =>
  changedItemFields(base, mine).reduce<Item>((merged, field) => ({ ...merged, [field]: mine[field] }), theirs);

/** One line of history: "Ribeye is sold out", "Ribeye renamed to Rib steak", "Ribeye: left nothing to 4". */
export const sayItemChange = (from: ItemFields, to: ItemFields, naming: ItemNaming): string => {
  const differences = itemDifferences(from, to, naming);
  const [only] = differences;
  if (only === undefined) return `${to.name} saved without a change`;
  if (differences.length === 1) {
    if (only.field === 'name') return `${from.name} renamed to ${to.name}`;
    if (only.field === 'soldOut') return to.soldOut ? `${to.name} is sold out` : `${to.name} is back on the menu`;
    if (only.field === 'section') return `${to.name} moved from ${only.from} to ${only.to}`;
  }
  return `${to.name}: ${differences.map(({ label, from: was, to: now }) => `${label.toLowerCase()} ${was} to ${now}`).join('; ')}`;
};
