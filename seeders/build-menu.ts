import { asId } from '@/lib/domain/site/ids';
import { allergens, type Allergen, type Item, type Menu, type Option, type OptionGroup } from '@/lib/domain/site/menu';
import { slug } from './slug';

/** Name, kitchen name (empty: the same), allergens with spaces between, seconds on the station, and option groups by name. */
export type DishRow = readonly [name: string, kitchenName: string, allergens: string, seconds: number, optionGroups?: readonly string[]];

/** One menu section with its dishes, in the order they stand on the menu. */
export type SectionRows = { readonly name: string; readonly course: string | null; readonly dishes: readonly DishRow[] };

export type GroupRows = { readonly name: string; readonly min: number; readonly max: number; readonly options: readonly (readonly [name: string, allergens: string])[] };

/** What is true of a few items only; by name. */
export type Remarks = Readonly<Record<string, Partial<Pick<Item, 'soldOut' | 'left' | 'noTicket'>>>>;

const readAllergens = (words: string): readonly Allergen[] => allergens.filter((allergen) => words.split(' ').includes(allergen));

const optionId = (group: string, option: string): Option['id'] => asId(slug(`${group} ${option}`));

const itemOf = (section: SectionRows, [name, kitchenName, contains, seconds, groups = []]: DishRow, position: number, remarks: Remarks): Item => ({
  id: asId(slug(name)), section: asId(slug(section.name)), name, kitchenName, allergens: readAllergens(contains),
  course: section.course === null ? null : asId(slug(section.course)), preparationSeconds: seconds, soldOut: false, left: null, noTicket: false,
  optionGroups: groups.map((group) => asId(slug(group))), position, version: 1, ...remarks[name],
});

/** A whole menu from its rows; ids come from the names. */
export const buildMenu = (sections: readonly SectionRows[], groups: readonly GroupRows[], remarks: Remarks = {}): Menu => ({
  sections: sections.map(({ name }, position) => ({ id: asId(slug(name)), name, position, version: 1 })),
  items: sections.flatMap((section) => section.dishes.map((dish, position) => itemOf(section, dish, position, remarks))),
  optionGroups: groups.map(({ name, min, max, options }): OptionGroup => ({
    id: asId(slug(name)), name, min, max, options: options.map(([option]) => optionId(name, option)), version: 1,
  })),
  options: groups.flatMap((group) => group.options.map(([name, contains], position): Option => ({
    id: optionId(group.name, name), group: asId(slug(group.name)), name, kitchenName: '', allergens: readAllergens(contains), position, version: 1,
  }))),
});
