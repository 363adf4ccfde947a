import type { OptionId } from '@/lib/domain/site/ids';
import type { Item } from '@/lib/domain/site/menu';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import type { OrderLine } from './order';

/** As few options as the item asks for, the first of each group unless others are wanted. */
export const neededOptions = (item: Item, site: Site, wanted: readonly OptionId[] = []): readonly OptionId[] =>
  item.optionGroups.flatMap((id) => {
    const group = site.menu.optionGroups.find((candidate) => candidate.id === id);
    if (group === undefined) return [];
    const chosen = group.options.filter((option) => wanted.includes(option)).slice(0, group.max);
    return [...chosen, ...group.options.filter((option) => !chosen.includes(option)).slice(0, Math.max(0, group.min - chosen.length))];
  });

export const newLine = (item: Item, site: Site, more: Partial<OrderLine> = {}): OrderLine => ({
  item: item.id, quantity: 1, seat: null, course: null, note: '', allergies: [], ...more, options: more.options ?? neededOptions(item, site),
});

/** Items that this plan would take an order for today, in the menu's order. */
export const itemsOnOffer = (site: Site, plan: Pick<Plan, 'offers'>): readonly Item[] =>
  site.menu.items.filter((item) => !item.soldOut && item.left !== 0 && (plan.offers === null || plan.offers.includes(item.section)));
