import type { CourseId, ItemId, OptionGroupId, OptionId, SectionId } from './ids';

/** Regulation (EU) No 1169/2011, Annex II: the fourteen that must be declared. */
export const allergens = [
  'gluten', 'crustaceans', 'eggs', 'fish', 'peanuts', 'soybeans', 'milk', 'nuts',
  'celery', 'mustard', 'sesame', 'sulphites', 'lupin', 'molluscs',
] as const;
export type Allergen = (typeof allergens)[number];

export type Section = { readonly id: SectionId; readonly name: string; readonly position: number; readonly version: number };

export type Item = {
  readonly id: ItemId;
  readonly section: SectionId;
  readonly name: string;
  /** The short name the kitchen reads; empty means the name itself. */
  readonly kitchenName: string;
  readonly allergens: readonly Allergen[];
  readonly course: CourseId | null;
  readonly preparationSeconds: number | null;
  readonly soldOut: boolean;
  /** How many are left; null when nobody counts. */
  readonly left: number | null;
  /** Vouchers and the like: ordered, but nothing prints. */
  readonly noTicket: boolean;
  readonly optionGroups: readonly OptionGroupId[];
  readonly position: number;
  readonly version: number;
};

export type OptionGroup = {
  readonly id: OptionGroupId;
  readonly name: string;
  /** How many options must, and may, be chosen. */
  readonly min: number;
  readonly max: number;
  readonly options: readonly OptionId[];
  readonly version: number;
};

export type Option = {
  readonly id: OptionId;
  readonly group: OptionGroupId;
  readonly name: string;
  readonly kitchenName: string;
  readonly allergens: readonly Allergen[];
  readonly position: number;
  readonly version: number;
};

/** Sections, items and options in order of position. */
export type Menu = {
  readonly sections: readonly Section[];
  readonly items: readonly Item[];
  readonly optionGroups: readonly OptionGroup[];
  readonly options: readonly Option[];
};

/** What the kitchen reads for an item or option. */
export const kitchenNameOf = (named: { readonly name: string; readonly kitchenName: string }): string =>
  named.kitchenName === '' ? named.name : named.kitchenName;
