import { z } from 'zod';
import { allergens } from '@/lib/domain/site/menu';

/** One schema for the table, the forms and the server; what it refuses it says in words. */
const id = z.string().min(1).max(36);
const words = (what: string) => z.string().normalize('NFC').trim().min(1, `${what} is empty.`).max(120, `${what} is longer than 120 characters.`).regex(/^[^\u0000-\u001f\u007f]*$/, `${what} has a control character in it.`);
const kitchenName = z.string().normalize('NFC').trim().max(120, 'The kitchen name is longer than 120 characters.').regex(/^[^\u0000-\u001f\u007f]*$/, 'The kitchen name has a control character in it.');

export const sectionInput = z.strictObject({ name: words('The section’s name') });
export type SectionInput = z.output<typeof sectionInput>;

export const itemInput = z.strictObject({
  section: id,
  name: words('The item’s name'),
  kitchenName: kitchenName.default(''),
  allergens: z.array(z.enum(allergens)).max(allergens.length).default([]),
  course: id.nullable().default(null),
  preparationSeconds: z.int('Say whole seconds.').min(0).max(86_400, 'That is more than a day.').nullable().default(null),
  soldOut: z.boolean().default(false),
  left: z.int('Say a whole number.').min(0).max(100_000).nullable().default(null),
  noTicket: z.boolean().default(false),
  optionGroups: z.array(id).max(20).default([]),
});
export type ItemInput = z.output<typeof itemInput>;

/** Several lines at once, as when rows are pasted: all of them or none. */
export const itemsInput = z.strictObject({ items: z.array(itemInput).min(1).max(500, 'Paste at most 500 lines at a time, or bring in a file.') });
/** A pasted block: lines that are there with the version they were read at, and new ones. */
export const pasteInput = z.strictObject({
  updates: z.array(z.strictObject({ id, version: z.int().min(1), item: itemInput })).max(500, 'Paste at most 500 lines at a time, or bring in a file.'),
  creates: z.array(itemInput).max(500, 'Paste at most 500 lines at a time, or bring in a file.'),
});
export type PasteInput = z.output<typeof pasteInput>;
export const orderInput = z.strictObject({ ids: z.array(id).min(1).max(5_000) });

export const optionGroupInput = z.strictObject({
  name: words('The group’s name'),
  min: z.int().min(0).max(50),
  max: z.int().min(1, 'At least one must be allowed.').max(50),
  options: z.array(z.strictObject({ id: id.nullable(), name: words('The option’s name'), kitchenName: kitchenName.default(''), allergens: z.array(z.enum(allergens)).default([]) })).min(1, 'A group needs an option.').max(100),
}).refine(({ min, max }) => min <= max, { path: ['min'], error: 'More must be chosen than may be.' });
export type OptionGroupInput = z.output<typeof optionGroupInput>;

const site = id;
export const siteParams = z.object({ site });
export const sectionParams = z.object({ site, section: id });
export const itemParams = z.object({ site, item: id });
export const groupParams = z.object({ site, group: id });

export const fileQuery = z.object({
  /** The mapping as JSON: field to column; left out, it is guessed. */
  mapping: z.string().max(2_000).optional(),
  /** Digest of the menu that the dry run looked at; given, the file is applied. */
  apply: z.string().length(64).optional(),
});
