/** What a column of the file can hold. */
export const menuFields = ['section', 'name', 'kitchenName', 'course', 'allergens', 'preparationSeconds', 'soldOut', 'left', 'noTicket', 'options'] as const;
export type MenuField = (typeof menuFields)[number];

export const fieldWords: Readonly<Record<MenuField, string>> = {
  section: 'Menu section', name: 'Item', kitchenName: 'Kitchen name', course: 'Course', allergens: 'Allergens',
  preparationSeconds: 'Preparation seconds', soldOut: 'Sold out', left: 'How many left', noTicket: 'No ticket', options: 'Options',
};

/** Headings that people write for each field, without case, accents and punctuation. */
const usual: Readonly<Record<MenuField, readonly string[]>> = {
  section: ['menu section', 'section', 'heading', 'category', 'group'],
  name: ['item', 'name', 'dish', 'item name', 'product', 'title'],
  kitchenName: ['kitchen name', 'short name', 'ticket name', 'print name'],
  course: ['course'],
  allergens: ['allergens', 'allergen', 'allergies', 'contains'],
  preparationSeconds: ['preparation seconds', 'prep seconds', 'preparation time', 'seconds'],
  soldOut: ['sold out', 'out', '86'],
  left: ['how many left', 'left', 'stock', 'remaining'],
  noTicket: ['no ticket', 'no print'],
  options: ['options', 'option groups', 'choices', 'modifiers'],
};

/** Which column of the file is which field; null where none is. Section and item must be somewhere. */
export type Mapping = Readonly<Record<MenuField, number | null>>;

const plain = (text: string): string => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase().replace(/[^a-z0-9]+/g, ' ').trim();

/** Guesses the mapping from the headings; a column is given to one field only. */
export const guessMapping = (headings: readonly string[]): Mapping => {
  const taken = new Set<number>();
  const find = (field: MenuField): number | null => {
    for (const word of usual[field]) {
      const index = headings.findIndex((heading, at) => !taken.has(at) && plain(heading) === word);
      if (index >= 0) {
        taken.add(index);
        return index;
      }
    }
    return null;
  };
  return Object.fromEntries(menuFields.map((field) => [field, find(field)])) as Mapping;
};
