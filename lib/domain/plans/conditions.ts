import type { OrderType } from '../site/order-types';
import { orderTypes } from '../site/order-types';
import type { Conditions } from '../site/plan';
import type { BoardSite } from './board-site';
import { listWords } from './words';

/** True when the rule holds for every order. */
export const isUnconditional = (conditions: Conditions): boolean =>
  conditions.orderTypes.length + conditions.areas.length + conditions.tills.length === 0;

/** Two sets of conditions are the same when their keys are, whatever order they were ticked in. */
export const conditionsKey = (conditions: Conditions): string =>
  [conditions.orderTypes, conditions.areas, conditions.tills].map((set) => set.toSorted().join(',')).join('|');

const orderTypeNames: Readonly<Record<OrderType, string>> = { 'eat-in': 'eat in', 'take-away': 'take away', delivery: 'delivery' };

export const sayOrderType = (orderType: OrderType): string => orderTypeNames[orderType];

const namesIn = (list: readonly { readonly id: string; readonly name: string }[], ids: readonly string[], gone: string): readonly string[] => {
  const known = list.filter((candidate) => ids.includes(candidate.id)).map((candidate) => candidate.name);
  return known.length < ids.length ? [...known, gone] : known;
};

/** One short tag for each condition named: "take away", "Terrace", "Till 2". */
export const conditionTags = (conditions: Conditions, site: BoardSite): readonly string[] => [
  ...orderTypes.filter((orderType) => conditions.orderTypes.includes(orderType)).map(sayOrderType),
  ...namesIn(site.areas, conditions.areas, 'an area that has gone'),
  ...namesIn(site.tills, conditions.tills, 'a till that has gone'),
];

/** "take away from Terrace", "Terrace", "Till 2 and Till 3"; empty when there are none. */
export const sayConditions = (conditions: Conditions, site: BoardSite): string => {
  const types = listWords(orderTypes.filter((orderType) => conditions.orderTypes.includes(orderType)).map(sayOrderType));
  const areas = listWords(namesIn(site.areas, conditions.areas, 'an area that has gone'));
  const tills = listWords(namesIn(site.tills, conditions.tills, 'a till that has gone'));
  const place = tills !== '' && areas !== '' ? `${tills} in ${areas}` : tills || areas;
  if (types === '') return place;
  return place === '' ? types : `${types} from ${place}`;
};
