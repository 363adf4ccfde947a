import type { OptionId } from '@/lib/domain/site/ids';
import type { Item } from '@/lib/domain/site/menu';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { Plan, Rule } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import type { Till } from '@/lib/domain/site/till';
import type { Order, OrderLine } from './order';
import { itemsOnOffer, neededOptions, newLine } from './order-line';

export const readyOrderKeys = ['table-of-four', 'drinks', 'split-dish', 'take-away', 'every-section', 'late-table'] as const;

/** No ready order asks for more of one item, so that none is refused for what is left. */
const mostOfOneItem = 12;

/** An order made up from the site's own menu, so that a person sees paper at one press. */
export type ReadyOrder = {
  readonly key: (typeof readyOrderKeys)[number];
  readonly name: string;
  /** What it shows. */
  readonly says: string;
  readonly order: Order;
};

type Kitchen = { readonly site: Site; readonly plan: Plan; readonly items: readonly Item[]; readonly till: Till };

const orderOf = (till: Till, lines: readonly OrderLine[], more: Partial<Order> = {}): Order => ({
  till: till.id, orderType: till.orderTypes[0] ?? 'eat-in', table: '14', covers: null, server: 'Ana', number: '0231', allergies: [], lines, ...more,
});

const lineMaker = (site: Site) => (item: Item, more: Partial<OrderLine> = {}): OrderLine => newLine(item, site, more);

const drinkWords = /drink|bar|wine|beer|beverage/i;

/** The site's courses that have food on offer, in order; a course of drinks is not one. */
const foodCourses = ({ site, items }: Kitchen): readonly (readonly Item[])[] => {
  const dishes = items.filter((item) => !item.noTicket);
  const courses = site.courses.filter(({ name }) => !drinkWords.test(name)).map(({ id }) => dishes.filter(({ course }) => course === id)).filter((course) => course.length > 0);
  return courses.length > 0 ? courses : [dishes];
};

const drinksOf = ({ site, items }: Kitchen): readonly Item[] => {
  const courses = new Set(site.courses.filter(({ name }) => drinkWords.test(name)).map(({ id }) => id));
  const sections = new Set(site.menu.sections.filter(({ name }) => drinkWords.test(name)).map(({ id }) => id));
  return items.filter((item) => !item.noTicket && ((item.course !== null && courses.has(item.course)) || sections.has(item.section)));
};

/** Every so many, so that a long list is not tried at its beginning only. */
const spread = <Value>(values: readonly Value[], count: number): readonly Value[] => {
  const step = Math.max(1, Math.floor(values.length / count));
  return Array.from({ length: Math.min(count, values.length) }, (_, index) => values[index * step]).flatMap((value) => (value === undefined ? [] : [value]));
};

const tableOfFour = (kitchen: Kitchen): Order => {
  const make = lineMaker(kitchen.site);
  const courses = foodCourses(kitchen).slice(0, 3);
  const lines = courses.flatMap((course, at) => {
    const picked = spread(course, 3);
    return [1, 2, 3, 4].flatMap((seat) => {
      const item = picked[(seat + at) % Math.max(1, picked.length)];
      return item === undefined ? [] : [make(item, { seat })];
    });
  });
  const [bottle] = drinksOf(kitchen);
  return orderOf(kitchen.till, [...lines, ...(bottle === undefined ? [] : [make(bottle)])], { covers: 4, allergies: [{ seat: 2, words: 'Tree nuts' }] });
};

const drinks = (kitchen: Kitchen): Order => {
  const { site, items } = kitchen;
  const bar = site.areas.find(({ name }) => drinkWords.test(name));
  const till = site.tills.find(({ area }) => area === bar?.id) ?? kitchen.till;
  const found = drinksOf(kitchen);
  const picked = spread(found.length > 0 ? found : items.filter((item) => !item.noTicket), 3);
  return orderOf(till, picked.map((item, index) => newLine(item, site, { quantity: index + 1 })), { table: 'Bar 3', covers: 3 });
};

const covers = (rule: Rule, item: Item): boolean => {
  const { target } = rule;
  return target.kind === 'option'
    || (target.kind === 'option-on-section' && target.section === item.section)
    || (target.kind === 'option-on-item' && target.item === item.id);
};

/** A dish with an option that another station makes; failing that, a dish with any option; failing that, any dish. */
const dishWithSplit = ({ site, plan, items }: Kitchen): { readonly item: Item; readonly option: OptionId | null; readonly says: string } | null => {
  const dishes = items.filter((item) => !item.noTicket);
  const choices = dishes.flatMap((item) => item.optionGroups
    .flatMap((id) => site.menu.optionGroups.find((group) => group.id === id)?.options ?? [])
    .map((option) => ({ item, option })));
  const splits = plan.rules.filter(({ kind }) => kind === 'split');
  const split = choices.find(({ item, option }) => splits.some((rule) => 'option' in rule.target && rule.target.option === option && covers(rule, item)));
  const [dish] = dishes;
  const [choice] = choices;
  if (split !== undefined) return { ...split, says: 'One dish that two stations make.' };
  if (choice !== undefined) return { ...choice, says: 'One dish with a choice on it.' };
  return dish === undefined ? null : { item: dish, option: null, says: 'One dish alone.' };
};

const splitDish = (kitchen: Kitchen): Pick<ReadyOrder, 'name' | 'says' | 'order'> => {
  const { site, till } = kitchen;
  const found = dishWithSplit(kitchen);
  if (found === null) return { name: 'One dish', says: '', order: orderOf(till, []) };
  const option = site.menu.options.find(({ id }) => id === found.option);
  const options = neededOptions(found.item, site, option === undefined ? [] : [option.id]);
  return {
    name: option === undefined ? found.item.name : `${found.item.name} with ${option.name.toLowerCase()}`,
    says: found.says,
    order: orderOf(till, [newLine(found.item, site, { seat: 1, options })], { table: '6', covers: 1 }),
  };
};

const tillSending = (site: Site, type: OrderType, otherwise: Till): { readonly till: Till; readonly orderType: OrderType } => {
  const till = site.tills.find(({ orderTypes }) => orderTypes.includes(type));
  return till === undefined ? { till: otherwise, orderType: otherwise.orderTypes[0] ?? 'eat-in' } : { till, orderType: type };
};

const takeAway = (kitchen: Kitchen): Order => {
  const { till, orderType } = tillSending(kitchen.site, 'take-away', kitchen.till);
  const courses = foodCourses(kitchen);
  const mains = courses[Math.min(1, courses.length - 1)] ?? [];
  const [drink] = drinksOf(kitchen);
  const dishes = spread(mains, 2).map((item) => newLine(item, kitchen.site));
  return orderOf(till, [...dishes, ...(drink === undefined ? [] : [newLine(drink, kitchen.site, { quantity: 2 })])], { table: '', orderType, number: '0232' });
};

const everySection = ({ site, items, till }: Kitchen): Order =>
  orderOf(till, site.menu.sections.flatMap((section) => {
    const item = items.find((candidate) => candidate.section === section.id);
    return item === undefined ? [] : [newLine(item, site)];
  }), { table: '20', covers: 10 });

/** From the till that the plan treats apart, where it treats one so; the last course, and a note that may be an allergy. */
const lateTable = (kitchen: Kitchen): Order => {
  const { site, plan } = kitchen;
  const apart = plan.rules.flatMap(({ conditions }) => [
    ...conditions.tills, ...site.tills.filter(({ area }) => conditions.areas.includes(area)).map(({ id }) => id),
  ]);
  const till = site.tills.find(({ id }) => apart.includes(id)) ?? site.tills.at(-1) ?? kitchen.till;
  const last = foodCourses(kitchen).at(-1) ?? [];
  const lines = spread(last, 2).map((item, index) => newLine(item, site, { seat: index + 1, note: index === 0 ? 'no nuts please' : '' }));
  const [drink] = drinksOf(kitchen).toReversed();
  return orderOf(till, [...lines, ...(drink === undefined ? [] : [newLine(drink, site, { quantity: 2 })])], { table: '31', covers: 2, number: '0289' });
};

/** Six orders for any site with a till; none without one. They use only what the plan offers, and nothing that is sold out. */
export const readyOrders = (site: Site, plan: Plan): readonly ReadyOrder[] => {
  const till = site.tills.find(({ kind, orderTypes }) => kind === 'fixed' && orderTypes.includes('eat-in')) ?? site.tills[0];
  const items = itemsOnOffer(site, plan).filter(({ left }) => left === null || left >= mostOfOneItem);
  if (till === undefined || items.length === 0) return [];
  const kitchen: Kitchen = { site, plan, items, till };
  const dish = splitDish(kitchen);
  const courses = Math.min(3, foodCourses(kitchen).length);
  return [
    { key: 'table-of-four', name: `A table of four, ${['', 'one course', 'two courses', 'three courses'][courses]} and an allergy`, says: 'Every course at once, and seat 2 may not have tree nuts.', order: tableOfFour(kitchen) },
    { key: 'drinks', name: 'Drinks at the bar', says: 'No food: does the kitchen stay quiet?', order: drinks(kitchen) },
    { key: 'split-dish', ...dish },
    { key: 'take-away', name: 'Take-away for two', says: 'Leaves without a table.', order: takeAway(kitchen) },
    { key: 'every-section', name: 'One of every menu section', says: 'Shows at a glance what prints nowhere.', order: everySection(kitchen) },
    { key: 'late-table', name: 'Late table', says: 'The last course from another part of the room, with a note to look at.', order: lateTable(kitchen) },
  ];
};

