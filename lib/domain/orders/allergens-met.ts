import type { Allergen } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import { allergiesOf } from '@/lib/domain/routing/pieces';
import { allergensSaid, allergyWords } from './allergy-words';
import type { Order } from './order';

/** A dish or option that holds what its guest may not eat: a person must look. */
export type AllergenMet = { readonly line: number; readonly allergen: Allergen; readonly message: string };

/** Compares what was said of each line, its seat and its table with what the menu declares of the dish and its options. */
export const allergensMet = (order: Order, site: Site): readonly AllergenMet[] =>
  order.lines.flatMap((line, index) => {
    const item = site.menu.items.find(({ id }) => id === line.item);
    if (item === undefined) return [];
    const said = new Set(allergiesOf(order, line).flatMap(allergensSaid));
    const options = site.menu.options.filter(({ id }) => line.options.includes(id));
    return [item, ...options].flatMap(({ name, allergens }) => allergens.filter((allergen) => said.has(allergen)).map((allergen) => ({
      line: index, allergen, message: `${name} contains ${allergyWords[allergen].toLowerCase()}, which was said as an allergy. Ask before it is sent.`,
    })));
  });
