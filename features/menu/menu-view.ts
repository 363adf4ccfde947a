import type { Item, Menu, OptionGroup, Section } from '@/lib/domain/site/menu';
import { kitchenNameOf } from '@/lib/domain/site/menu';
import type { Course, Site } from '@/lib/domain/site/site';
import type { ItemInput } from './schema';

/** One section of the menu as the page shows it. */
export type MenuView = {
  readonly siteId: string;
  readonly sections: readonly (Section & { readonly items: number })[];
  readonly section: Section | null;
  readonly items: readonly Item[];
  readonly courses: readonly Course[];
  readonly groups: readonly OptionGroup[];
  readonly options: Menu['options'];
  readonly search: string;
};

const matches = (item: Item, search: string): boolean =>
  [item.name, kitchenNameOf(item)].some((name) => name.toLowerCase().includes(search.toLowerCase()));

/** A search looks through the whole menu; otherwise the chosen section is shown, or the first. */
export const viewMenu = (site: Site, chosen: string | undefined, search: string): MenuView => {
  const { menu } = site;
  const counts = new Map<string, number>();
  for (const item of menu.items) counts.set(item.section, (counts.get(item.section) ?? 0) + 1);
  const section = search === '' ? menu.sections.find((one) => one.id === chosen) ?? menu.sections[0] ?? null : null;
  return {
    siteId: site.id,
    sections: menu.sections.map((one) => ({ ...one, items: counts.get(one.id) ?? 0 })),
    section,
    items: menu.items.filter((item) => (search === '' ? item.section === section?.id : matches(item, search))),
    courses: site.courses, groups: menu.optionGroups, options: menu.options, search,
  };
};

export const inputOf = (item: Item): ItemInput => ({
  section: item.section, name: item.name, kitchenName: item.kitchenName, allergens: [...item.allergens], course: item.course, preparationSeconds: item.preparationSeconds,
  soldOut: item.soldOut, left: item.left, noTicket: item.noTicket, optionGroups: [...item.optionGroups],
});

export const blankItem = (section: string, like: Item | undefined): ItemInput => ({
  section, name: '', kitchenName: '', allergens: [], course: like?.course ?? null, preparationSeconds: null, soldOut: false, left: null, noTicket: false, optionGroups: [],
});
