import { addLine, emptyOrder, fromTill } from '@/lib/domain/orders/edit-order';
import { newLine } from '@/lib/domain/orders/order-line';
import { asId, type OptionId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { Site } from '@/lib/domain/site/site';
import type { PlanChoice } from './plan-choices';
import type { Draft } from './schema';

/** The plan that a link asks for: as edited when there is such, else as it is live. */
const choiceOf = (choices: readonly PlanChoice[], plan: string | null): PlanChoice | undefined =>
  plan === null ? undefined : choices.find((choice) => choice.key === plan) ?? choices.find((choice) => choice.plan.id === plan);

/**
 * What a link from a finding wants tried (`?plan=&till=&type=&item=&option=`), over the draft that is there. Null when the
 * link asks for nothing that this site has.
 */
export const linkedDraft = (site: Site, choices: readonly PlanChoice[], kept: Draft | null, query: URLSearchParams): Draft | null => {
  const choice = choiceOf(choices, query.get('plan'));
  const item = site.menu.items.find((one) => one.id === query.get('item'));
  if (choice === undefined && item === undefined) return null;
  const key = choice?.key ?? kept?.plan ?? choices[0]?.key;
  if (key === undefined) return null;
  if (item === undefined) return { plan: key, present: kept?.present ?? 'planned', order: kept?.order ?? emptyOrder(site) };
  const till = site.tills.find((one) => one.id === query.get('till'));
  const from = till === undefined ? emptyOrder(site) : fromTill(emptyOrder(site), site, till.id);
  const type = query.get('type') as OrderType | null;
  const order = type !== null && till?.orderTypes.includes(type) === true ? { ...from, orderType: type } : from;
  const options = query.getAll('option').map((option) => asId<OptionId>(option)).filter((option) => site.menu.options.some((one) => one.id === option));
  return { plan: key, present: 'planned', order: addLine(order, newLine(item, site, { options })) };
};
