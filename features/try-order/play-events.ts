import type { OrderEvent } from '@/lib/domain/orders/event';
import type { Order } from '@/lib/domain/orders/order';
import { step, type Printed } from '@/lib/domain/orders/step';
import type { Tab } from '@/lib/domain/orders/tab';
import type { Clock } from '@/lib/domain/routing/route-order';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { layOutTicket } from '@/lib/domain/tickets/lay-out-ticket';
import type { TicketSheet } from '@/lib/domain/tickets/sheet';
import type { Ticket } from '@/lib/domain/tickets/ticket';

/** One thing that a person did with the order, and the kitchen as it was when they did it. */
export type Played = { readonly event: Exclude<OrderEvent, { readonly kind: 'send' }>; readonly plan: Plan; readonly present: Present };

/** What an event printed, laid out as paper. */
export type PlayedPaper = Played & { readonly tab: Tab; readonly printed: Printed; readonly paper: readonly { readonly ticket: Ticket; readonly sheet: TicketSheet }[] };

const paperOf = (site: Site, tickets: readonly Ticket[]): PlayedPaper['paper'] =>
  tickets.flatMap((ticket) => {
    const printer = site.printers.find((one) => one.id === ticket.printer);
    return printer === undefined ? [] : [{ ticket, sheet: layOutTicket(ticket, printer) }];
  });

/** Sends an order and plays what happens to it afterwards, one event on the other's tab. */
export const playEvents = (site: Site, plan: Plan, present: Present, order: Order, played: readonly Played[], clock: Clock): { readonly tab: Tab; readonly steps: readonly PlayedPaper[] } => {
  let [tab] = step({ site, plan, present, clock }, null, { kind: 'send', order });
  const steps = played.map((one): PlayedPaper => {
    const [after, printed] = step({ site, plan: one.plan, present: one.present, clock }, tab, one.event);
    tab = after;
    return { ...one, tab: after, printed, paper: paperOf(site, printed.tickets) };
  });
  return { tab, steps };
};
