import type { Item, Option, OptionGroup } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import type { Order, OrderLine } from './order';

/** Why an order, or one line of it, cannot be sent; `line` is null when it is about the order itself. */
export type Refusal = {
  readonly line: number | null;
  readonly code:
    | 'unknown-till' | 'unknown-area' | 'order-type-not-sent' | 'no-lines'
    | 'unknown-item' | 'unknown-course' | 'quantity-outside' | 'seat-outside'
    | 'option-not-of-item' | 'option-twice' | 'too-few-options' | 'too-many-options';
  readonly message: string;
};

export const largestQuantity = 999;
export const largestSeat = 999;

const isWholeBetween = (value: number, least: number, most: number): boolean =>
  Number.isInteger(value) && value >= least && value <= most;

const groupsOf = (item: Item, site: Site): readonly OptionGroup[] =>
  item.optionGroups.flatMap((id) => site.menu.optionGroups.find((group) => group.id === id) ?? []);

const refuseGroup = (group: OptionGroup, line: OrderLine, item: Item, index: number): readonly Refusal[] => {
  const chosen = line.options.filter((option) => group.options.includes(option)).length;
  if (chosen < group.min) {
    const more = group.min - chosen;
    return [{ line: index, code: 'too-few-options', message: `${item.name} needs ${more} more from ${group.name}. Choose ${more === 1 ? 'one' : more}.` }];
  }
  return chosen <= group.max ? [] : [{
    line: index, code: 'too-many-options', message: `${item.name} takes at most ${group.max} from ${group.name}, this has ${chosen}. Take ${chosen - group.max} off.`,
  }];
};

const refuseOptions = (line: OrderLine, item: Item, site: Site, index: number): readonly Refusal[] => {
  const groups = groupsOf(item, site);
  const allowed = new Set(groups.flatMap((group) => group.options));
  const nameOf = (id: Option['id']): string => site.menu.options.find((option) => option.id === id)?.name ?? id;
  return [
    ...[...new Set(line.options)].filter((option) => !allowed.has(option)).map((option): Refusal => ({
      line: index, code: 'option-not-of-item', message: `${item.name} does not come with “${nameOf(option)}”. Take it off.`,
    })),
    ...(new Set(line.options).size === line.options.length ? [] : [{
      line: index, code: 'option-twice' as const, message: `An option of ${item.name} is chosen twice. Choose it once.`,
    }]),
    ...groups.flatMap((group) => refuseGroup(group, line, item, index)),
  ];
};

const refuseLine = (line: OrderLine, site: Site, index: number): readonly Refusal[] => {
  const item = site.menu.items.find((candidate) => candidate.id === line.item);
  if (item === undefined) return [{ line: index, code: 'unknown-item', message: `This menu has no item “${line.item}”. Choose another.` }];
  const refusals: Refusal[] = [];
  if (!isWholeBetween(line.quantity, 1, largestQuantity)) {
    refusals.push({ line: index, code: 'quantity-outside', message: `${line.quantity} of ${item.name} cannot be ordered. Say a whole number from 1 to ${largestQuantity}.` });
  }
  if (line.seat !== null && !isWholeBetween(line.seat, 1, largestSeat)) {
    refusals.push({ line: index, code: 'seat-outside', message: `There is no seat ${line.seat}. Say a whole number from 1, or the table.` });
  }
  if (line.course !== null && !site.courses.some((course) => course.id === line.course)) {
    refusals.push({ line: index, code: 'unknown-course', message: `This site has no course “${line.course}”. Choose one of its own.` });
  }
  return [...refusals, ...refuseOptions(line, item, site, index)];
};

/**
 * Everything about an order that no plan could route, all at once and line by line. Whether a plan offers an item, and
 * whether it is sold out, is the plan's to say.
 */
export const refuseOrder = (order: Order, site: Site): readonly Refusal[] => {
  const refusals: Refusal[] = [];
  const till = site.tills.find((candidate) => candidate.id === order.till);
  if (till === undefined) {
    refusals.push({ line: null, code: 'unknown-till', message: `This site has no till “${order.till}”. Choose one of its own.` });
  } else if (!till.orderTypes.includes(order.orderType)) {
    refusals.push({ line: null, code: 'order-type-not-sent', message: `${till.name} does not send this type of order. Choose another till or type.` });
  }
  if (order.area !== undefined && !site.areas.some((area) => area.id === order.area)) {
    refusals.push({ line: null, code: 'unknown-area', message: `This site has no area “${order.area}”. Choose one of its own.` });
  }
  if (order.lines.length === 0) refusals.push({ line: null, code: 'no-lines', message: 'The order is empty. Add an item.' });
  for (const allergy of order.allergies) {
    if (allergy.seat === null || isWholeBetween(allergy.seat, 1, largestSeat)) continue;
    refusals.push({ line: null, code: 'seat-outside', message: `There is no seat ${allergy.seat} to have an allergy. Say a whole number from 1, or the table.` });
  }
  return [...refusals, ...order.lines.flatMap((line, index) => refuseLine(line, site, index))];
};
