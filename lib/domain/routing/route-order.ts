import type { Item } from '@/lib/domain/site/menu';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { Order, OrderLine } from '@/lib/domain/orders/order';
import type { Ticket } from '@/lib/domain/tickets/ticket';
import { makeTickets, type TicketHead } from './make-tickets';
import { pieceMaker, type Loss, type Pieces } from './pieces';
import type { Context } from './compile-plan';
import { routeLine, type LineRoute } from './route-line';
import { prepareRouting } from './routing';

/** What became of one line of an order: exactly one of these. */
export type RoutedLine =
  | { readonly line: number; readonly outcome: 'refused'; readonly reason: string; readonly route: null }
  | { readonly line: number; readonly outcome: 'no ticket'; readonly route: null }
  | { readonly line: number; readonly outcome: LineRoute['outcome']; readonly route: LineRoute };

export type RoutedOrder = {
  readonly lines: readonly RoutedLine[];
  readonly tickets: readonly Ticket[];
  readonly losses: readonly Loss[];
};

/** The wall clock of the site, "HH:MM". */
export type Clock = { readonly time: string };

/** Step 0: why an item cannot be ordered now, in words; null when it can. */
export const whyNotNow = (item: Item | undefined, plan: Plan, quantity: number): string | null => {
  if (item === undefined) return 'This item is not on the menu any more.';
  if (plan.offers !== null && !plan.offers.includes(item.section)) return `${item.name} is not offered in ${plan.name}.`;
  if (item.soldOut || item.left === 0) return `${item.name} is sold out.`;
  if (item.left !== null && quantity > item.left) return `Only ${item.left} of ${item.name} ${item.left === 1 ? 'is' : 'are'} left, this asks for ${quantity}.`;
  return null;
};

export const contextOf = (site: Pick<Site, 'tills'>, order: Pick<Order, 'till' | 'orderType' | 'area'>): Context => {
  const area = order.area ?? site.tills.find((till) => till.id === order.till)?.area;
  if (area === undefined) throw new Error(`The order comes from the unknown till ${order.till}; refuse it first.`);
  return { orderType: order.orderType, till: order.till, area };
};

export const headOf = (site: Pick<Site, 'tills'>, order: Order, sending: number, clock: Clock, event: TicketHead['event'] = { kind: 'send', words: [] }): TicketHead => ({
  event,
  table: order.table,
  covers: order.covers,
  orderType: order.orderType,
  till: site.tills.find((till) => till.id === order.till)?.name ?? '',
  server: order.server,
  orderNumber: order.number,
  sending,
  time: clock.time,
});

const routeOne = (site: Site, plan: Plan, line: OrderLine, index: number, route: () => LineRoute): RoutedLine => {
  const item = site.menu.items.find((one) => one.id === line.item);
  const reason = whyNotNow(item, plan, line.quantity);
  if (reason !== null) return { line: index, outcome: 'refused', reason, route: null };
  if (item?.noTicket === true) return { line: index, outcome: 'no ticket', route: null };
  const record = route();
  return { line: index, outcome: record.outcome, route: record };
};

/** On a sending, a held line shows on copies only, marked HOLD; the cooks hear of it when it is fired. */
const withoutHeld = (made: Pieces, held: boolean): Pieces => (held
  ? { pieces: made.pieces.filter((piece) => piece.kind === 'copy').map((piece) => ({ ...piece, line: { ...piece.line, marks: [...piece.line.marks, 'HOLD'] } })), losses: made.losses.filter((loss) => loss.kind === 'copy') }
  : made);

export const tableAllergiesOf = (order: Pick<Order, 'allergies'>): readonly string[] =>
  order.allergies.filter((allergy) => allergy.seat === null).map((allergy) => allergy.words);

/**
 * Sends an order: every line through the steps, and the tickets that come out, in the order they are sorted.
 *
 * Refuse what no plan could route first (`refuseOrder`); an unknown till throws, an unknown item is a refused line.
 */
export const routeOrder = (site: Site, plan: Plan, present: Present, order: Order, clock: Clock, sending = 1): RoutedOrder => {
  const routing = prepareRouting(site, plan, present);
  const context = contextOf(site, order);
  const makePieces = pieceMaker(site);
  const lines = order.lines.map((line, index) => routeOne(site, plan, line, index, () => routeLine(routing, line.item, line.options, context)));
  const made = lines.flatMap((routed) => {
    const line = order.lines[routed.line];
    return routed.route === null || line === undefined ? [] : [withoutHeld(makePieces(order, line, routed.line, routed.route), line.held ?? false)];
  });
  return {
    lines,
    tickets: makeTickets(site, made.flatMap(({ pieces }) => pieces), headOf(site, order, sending, clock), tableAllergiesOf(order)),
    losses: made.flatMap(({ losses }) => losses),
  };
};
