import type { Item, Menu } from '@/lib/domain/site/menu';
import { largestQuantity } from './refuse-order';

/** "3 crab" is three of what "crab" finds; a number alone is sought as words. */
export type Sought = { readonly quantity: number; readonly words: readonly string[] };

const folded = (text: string): string => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();

export const readSearch = (typed: string): Sought => {
  const [, number, rest] = /^\s*(\d{1,3})\s*[x×]?\s+(\S.*)$/iu.exec(typed) ?? [];
  const quantity = Number(number ?? 1);
  return { quantity: Math.min(Math.max(quantity, 1), largestQuantity), words: folded(rest ?? typed).split(/\s+/).filter((word) => word !== '') };
};

/** Lower stands first: the name begins so, a word of it begins so, it stands anywhere, only the section or kitchen name does. */
const rankOf = (item: Item, section: string, words: readonly string[]): number | null => {
  const name = folded(item.name);
  const all = `${name} ${folded(item.kitchenName)} ${folded(section)}`;
  if (!words.every((word) => all.includes(word))) return null;
  const [first = ''] = words;
  if (name.startsWith(first)) return 0;
  if (name.includes(` ${first}`)) return 1;
  return words.every((word) => name.includes(word)) ? 2 : 3;
};

/** Items that have every word somewhere in their name, kitchen name or menu section, the likeliest first; accents do not count. */
export const findItems = (menu: Pick<Menu, 'items' | 'sections'>, { words }: Sought): readonly Item[] => {
  const sections = new Map(menu.sections.map(({ id, name }) => [id, name]));
  return menu.items
    .flatMap((item) => {
      const rank = rankOf(item, sections.get(item.section) ?? '', words);
      return rank === null ? [] : [{ item, rank }];
    })
    .toSorted((left, right) => left.rank - right.rank)
    .map(({ item }) => item);
};
