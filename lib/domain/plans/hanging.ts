import type { ItemId } from '../site/ids';
import type { PlanContent, Rule } from '../site/plan';
import type { BoardItem, BoardSite } from './board-site';
import { isUnconditional } from './conditions';
import { targetKey } from './targets';

/** Items that this plan offers and that print at all. */
export const printingItems = (site: BoardSite, content: PlanContent): readonly BoardItem[] => {
  const offered = content.offers === null ? null : new Set(content.offers);
  return site.menu.items.filter((item) => !item.noTicket && (offered === null || offered.has(item.section)));
};

/**
 * The `send` rule that wins each printing item when nothing is known of the order: of the rules without conditions
 * the narrowest (item over section over everything), of equals the later. Null where none covers it.
 */
export const unconditionalWinners = (site: BoardSite, content: PlanContent): ReadonlyMap<ItemId, Rule | null> => {
  const byTarget = new Map<string, Rule>();
  for (const rule of content.rules) {
    if (rule.kind === 'send' && isUnconditional(rule.conditions)) byTarget.set(targetKey(rule.target), rule);
  }
  return new Map(printingItems(site, content).map((item) => [
    item.id,
    byTarget.get(`item:${item.id}`) ?? byTarget.get(`section:${item.section}`) ?? byTarget.get('everything') ?? null,
  ]));
};
