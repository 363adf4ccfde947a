import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { Loss } from '@/lib/domain/routing/pieces';
import { routeOrder, type Clock, type RoutedLine } from '@/lib/domain/routing/route-order';
import { layOutTicket } from '@/lib/domain/tickets/lay-out-ticket';
import type { TicketSheet } from '@/lib/domain/tickets/sheet';
import type { Ticket } from '@/lib/domain/tickets/ticket';
import { unprintable, type Unprintable } from '@/lib/domain/tickets/unprintable';
import { allergensMet, type AllergenMet } from './allergens-met';
import type { Order } from './order';
import { refuseOrder, type Refusal } from './refuse-order';

export type TriedTicket = { readonly ticket: Ticket; readonly sheet: TicketSheet; readonly unprintable: readonly Unprintable[] };

/** What an order would do, with every line counted by its place in the order. */
export type TriedOrder = {
  readonly refusals: readonly Refusal[];
  /** Lines that were not refused as impossible. */
  readonly lines: readonly RoutedLine[];
  readonly tickets: readonly TriedTicket[];
  readonly losses: readonly Loss[];
  readonly allergensMet: readonly AllergenMet[];
};

const nothing = { lines: [], tickets: [], losses: [] };

/** Puts the order's own line numbers back where impossible lines were left out before routing. */
const renumbered = (ticket: Ticket, kept: readonly number[]): Ticket => ({
  ...ticket,
  courses: ticket.courses.map(({ course, lines }) => ({ course, lines: lines.map((line) => ({ ...line, sourceLine: kept[line.sourceLine] ?? line.sourceLine })) })),
});

/**
 * Tries an order without sending it: what is refused, line by line, and for the rest the tickets as they would print,
 * what would be lost, and what a person should look at. A fault of the order itself (its till, its type) stops all of it.
 */
export const tryOrder = (site: Site, plan: Plan, present: Present, order: Order, clock: Clock): TriedOrder => {
  const refusals = refuseOrder(order, site);
  const met = allergensMet(order, site);
  if (refusals.some(({ line }) => line === null)) return { refusals, ...nothing, allergensMet: met };
  const refused = new Set(refusals.map(({ line }) => line));
  const kept = order.lines.flatMap((_, index) => (refused.has(index) ? [] : [index]));
  const routed = routeOrder(site, plan, present, { ...order, lines: order.lines.filter((_, index) => !refused.has(index)) }, clock);
  const printers = new Map(site.printers.map((printer) => [printer.id, printer]));
  return {
    refusals,
    lines: routed.lines.map((line) => ({ ...line, line: kept[line.line] ?? line.line })),
    tickets: routed.tickets.flatMap((ticket) => {
      const printer = printers.get(ticket.printer);
      if (printer === undefined) return [];
      const own = renumbered(ticket, kept);
      return [{ ticket: own, sheet: layOutTicket(own, printer), unprintable: unprintable(own, printer) }];
    }),
    losses: routed.losses.map((loss) => ({ ...loss, sourceLine: kept[loss.sourceLine] ?? loss.sourceLine })),
    allergensMet: met,
  };
};
