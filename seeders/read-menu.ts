import { asId } from '@/lib/domain/site/ids';
import { allergens, type Allergen, type Item, type Menu, type Option, type OptionGroup, type Section } from '@/lib/domain/site/menu';

/** "Name | KITCHEN NAME | allergens | option groups", kitchen name and the rest may be empty. */
export type MenuText = { readonly section: string; readonly course: string; readonly seconds: number; readonly lines: readonly string[] };
/** "Name | KITCHEN NAME | allergens". */
export type GroupText = { readonly group: string; readonly min: number; readonly max: number; readonly lines: readonly string[] };

const slug = (text: string): string => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase().replace(/[^a-z0-9]+/g, '-').replace(/^-|-$/g, '').slice(0, 24);

const readAllergens = (text: string): readonly Allergen[] =>
  text.split(',').map((word) => word.trim()).filter((word): word is Allergen => (allergens as readonly string[]).includes(word));

const cells = (line: string): readonly string[] => line.split('|').map((cell) => cell.trim());

/** Reads a demo menu written as text; ids come from the site and the names, so that every seeding gives the same. */
export const readMenu = (prefix: string, sections: readonly MenuText[], groups: readonly GroupText[]): Menu => {
  const idOf = (kind: string, ...names: readonly string[]): string => `${prefix}-${kind}-${names.map(slug).join('-')}`.slice(0, 36);
  const readSections = sections.map(({ section }, position): Section => ({ id: asId(idOf('s', section)), name: section, position, version: 1 }));
  const options = groups.flatMap(({ group, lines }) => lines.map((line, position): Option => {
    const [name = '', kitchenName = '', said = ''] = cells(line);
    return { id: asId(idOf('o', group, name)), group: asId(idOf('g', group)), name, kitchenName, allergens: readAllergens(said), position, version: 1 };
  }));
  const optionGroups = groups.map(({ group, min, max }): OptionGroup => ({
    id: asId(idOf('g', group)), name: group, min, max, version: 1, options: options.filter((option) => option.group === idOf('g', group)).map((option) => option.id),
  }));
  const items = sections.flatMap(({ section, course, seconds, lines }) => lines.map((line, position): Item => {
    const [name = '', kitchenName = '', said = '', groupNames = ''] = cells(line);
    return {
      id: asId(idOf('i', name)), section: asId(idOf('s', section)), name, kitchenName, allergens: readAllergens(said), course: asId(`${prefix}-c-${slug(course)}`),
      preparationSeconds: seconds + (position % 4) * 30, soldOut: false, left: null, noTicket: false, position, version: 1,
      optionGroups: groupNames.split(',').map((word) => word.trim()).filter((word) => word !== '').map((word) => asId(idOf('g', word))),
    };
  }));
  return { sections: readSections, items, optionGroups, options };
};
