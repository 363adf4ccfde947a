import type { Order, OrderLine } from '@/lib/domain/orders/order';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import { explainLine, type Sentence } from '@/lib/domain/routing/explain';
import type { Site } from '@/lib/domain/site/site';

export const counted = (count: number, one: string, many = `${one}s`): string => `${count} ${count === 1 ? one : many}`;

export const itemName = (site: Site, line: OrderLine): string => site.menu.items.find(({ id }) => id === line.item)?.name ?? 'Unknown item';

/** "Seat 4, mains, medium, side salad". */
export const lineDetail = (site: Site, line: OrderLine): string => {
  const item = site.menu.items.find(({ id }) => id === line.item);
  const course = site.courses.find(({ id }) => id === (line.course ?? item?.course));
  const options = line.options.flatMap((id) => site.menu.options.find((option) => option.id === id)?.name ?? []);
  const seat = line.seat === null ? 'Table' : `Seat ${line.seat}`;
  return [seat, course?.name.toLowerCase() ?? '', ...options.map((name) => name.toLowerCase()), line.note, line.held ? 'held' : ''].filter((words) => words !== '').join(', ');
};

/** "Dinner plan, Till 2, Main room, to eat in" without the last part. */
export const contextWords = (site: Site, order: Order, planName: string): string => {
  const till = site.tills.find(({ id }) => id === order.till);
  const area = site.areas.find(({ id }) => id === (order.area ?? till?.area));
  return [`${planName} plan`, till?.name, area?.name].filter(Boolean).join(', ');
};

export type LineState = { readonly tone: 'quiet' | 'look' | 'lost'; readonly words: string };

/** What to say beside a line that does not simply print; null when it does. */
export const lineState = (tried: TriedOrder, index: number): LineState | null => {
  const refusals = tried.refusals.filter(({ line }) => line === index);
  if (refusals.length > 0) return { tone: 'look', words: refusals.map(({ message }) => message).join(' ') };
  const routed = tried.lines.find(({ line }) => line === index);
  if (routed === undefined) return null;
  switch (routed.outcome) {
    case 'refused': return { tone: 'look', words: `${routed.reason} Nothing is sent for this line.` };
    case 'no ticket': return { tone: 'quiet', words: 'Needs no ticket.' };
    case 'lost': return { tone: 'lost', words: 'Prints nowhere.' };
    case 'part lost': return { tone: 'lost', words: 'Prints only in part.' };
    case 'prints': return null;
  }
};

export const ticketsOfLine = (tried: TriedOrder, index: number): number =>
  tried.tickets.filter(({ ticket }) => ticket.courses.some(({ lines }) => lines.some(({ sourceLine }) => sourceLine === index))).length;

export const sentencesOf = (tried: TriedOrder, index: number, site: Site): readonly Sentence[] => {
  const route = tried.lines.find(({ line }) => line === index)?.route ?? null;
  return route === null ? [] : explainLine(route, site);
};
