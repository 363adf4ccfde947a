import { amend } from './amend';
import type { OrderEvent } from './event';
import { fire } from './fire';
import { remake, sendLines } from './send-lines';
import { sendMessage } from './send-message';
import type { Tab } from './tab';
import { merge, move, reprint, rush, voidLine } from './word-of-lines';
import { begin, type Kitchen, type Step } from './work';

export type { Kitchen, Printed, Step } from './work';

const noTab = (kitchen: Kitchen, order: Extract<OrderEvent, { kind: 'send' }>['order']): Tab => ({
  table: order.table, area: order.area ?? kitchen.site.tills.find((till) => till.id === order.till)!.area, till: order.till, orderType: order.orderType,
  covers: order.covers, server: order.server, number: order.number, allergies: order.allergies, sendings: 0, lines: [],
});

/**
 * One event of an order: what the tab is afterwards, and what prints. Pure: the kitchen of the moment is an argument, so
 * that a voided line follows its paper even when the plan has changed since.
 *
 * @param tab null before the order is sent; any event but `send` then throws
 */
export const step = (kitchen: Kitchen, tab: Tab | null, event: OrderEvent): Step => {
  if (event.kind === 'send') return sendLines(begin(kitchen, noTab(kitchen, event.order)), event.order.till, event.order.lines, [], 'send');
  if (tab === null) throw new Error(`An order that was never sent cannot ${event.kind}.`);
  const work = begin(kitchen, tab);
  switch (event.kind) {
    case 'add': return sendLines(begin(kitchen, { ...tab, allergies: [...tab.allergies, ...event.allergies] }), event.till, event.lines, [], 'send');
    case 'fire': return fire(work, event.till, event.course);
    case 'amend': return amend(work, event);
    case 'void': return voidLine(work, event);
    case 'move': return move(work, event);
    case 'merge': return merge(work, event);
    case 'remake': return remake(work, event);
    case 'message': return sendMessage(work, event);
    case 'rush': return rush(work, event.till, event.course);
    case 'reprint': return reprint(work, event.till, event.sending);
  }
};
