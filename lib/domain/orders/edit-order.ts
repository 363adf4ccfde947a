import type { OptionId, TillId } from '@/lib/domain/site/ids';
import type { OptionGroup } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import type { Order, OrderLine, SaidAllergy } from './order';

export const emptyOrder = (site: Site): Order => {
  const till = site.tills.find(({ kind }) => kind === 'fixed') ?? site.tills[0];
  return {
    till: till?.id ?? ('' as TillId), orderType: till?.orderTypes[0] ?? 'eat-in', table: '1', covers: 2, server: '', number: '0001', lines: [], allergies: [],
  };
};

/** A till brings its own area, and an order type it can send. */
export const fromTill = (order: Order, site: Site, id: TillId): Order => {
  const till = site.tills.find((candidate) => candidate.id === id);
  if (till === undefined) return order;
  const { area: _, ...rest } = order;
  return { ...rest, till: id, orderType: till.orderTypes.includes(order.orderType) ? order.orderType : till.orderTypes[0] ?? order.orderType };
};

export const addLine = (order: Order, line: OrderLine): Order => ({ ...order, lines: [...order.lines, line] });

export const changeLine = (order: Order, index: number, change: Partial<OrderLine>): Order => ({
  ...order, lines: order.lines.map((line, at) => (at === index ? { ...line, ...change } : line)),
});

export const removeLine = (order: Order, index: number): Order => ({ ...order, lines: order.lines.filter((_, at) => at !== index) });

/** In a group of one, choosing replaces; in others it adds, and choosing again takes off. */
export const toggleOption = (line: OrderLine, group: OptionGroup, option: OptionId): readonly OptionId[] => {
  if (line.options.includes(option)) return group.min === 1 && group.max === 1 ? line.options : line.options.filter((chosen) => chosen !== option);
  return [...(group.max === 1 ? line.options.filter((chosen) => !group.options.includes(chosen)) : line.options), option];
};

const same = (left: SaidAllergy, right: SaidAllergy): boolean => left.seat === right.seat && left.words.toLowerCase() === right.words.toLowerCase();

/** Said once is enough; empty words are none. */
export const sayAllergy = (order: Order, said: SaidAllergy): Order => {
  const allergy = { seat: said.seat, words: said.words.trim() };
  return allergy.words === '' || order.allergies.some((known) => same(known, allergy)) ? order : { ...order, allergies: [...order.allergies, allergy] };
};

export const takeBackAllergy = (order: Order, said: SaidAllergy): Order => ({ ...order, allergies: order.allergies.filter((known) => !same(known, said)) });

/** Seats to choose from: as many as there are covers, and every seat that is spoken of already. */
export const seatsOf = (order: Order): readonly number[] => {
  const spoken = [...order.lines.map(({ seat }) => seat), ...order.allergies.map(({ seat }) => seat)].flatMap((seat) => (seat === null ? [] : [seat]));
  const most = Math.max(Math.min(order.covers ?? 0, 60), ...spoken.filter((seat) => seat <= 60), 1);
  return [...new Set([...Array.from({ length: most }, (_, index) => index + 1), ...spoken])].toSorted((left, right) => left - right);
};
