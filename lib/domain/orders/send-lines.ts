import { pieceMaker, type Loss, type Piece } from '@/lib/domain/routing/pieces';
import { routeLine } from '@/lib/domain/routing/route-line';
import { whyNotNow } from '@/lib/domain/routing/route-order';
import type { TillId } from '@/lib/domain/site/ids';
import type { LineMark } from '@/lib/domain/tickets/ticket';
import type { OrderEvent } from './event';
import type { OrderLine } from './order';
import type { Tab, TabLine } from './tab';
import { nothing, partsOf, type Step, type Work } from './work';

/** A new sending: the cooks get what is not held, copies show everything. */
export const sendLines = ({ kitchen, routing, tab, print }: Work, till: TillId, lines: readonly OrderLine[], marks: readonly LineMark[], kind: 'send' | 'remake'): Step => {
  const { site, plan } = kitchen;
  const sending = tab.sendings + 1;
  const makePieces = pieceMaker(site);
  const context = { orderType: tab.orderType, area: tab.area, till };
  const pieces: Piece[] = [];
  const losses: Loss[] = [];
  const refusals: string[] = [];
  const added = lines.flatMap((line, offset): readonly TabLine[] => {
    const item = site.menu.items.find((one) => one.id === line.item);
    const reason = whyNotNow(item, plan, line.quantity);
    if (reason !== null) {
      refusals.push(reason);
      return [];
    }
    const index = tab.lines.length + offset - refusals.length;
    const held = line.held ?? false;
    if (item?.noTicket === true) return [{ line, sending, held: false, route: null, printed: [], voided: 0 }];
    const route = routeLine(routing, line.item, line.options, context);
    const made = makePieces(tab, line, index, route, held ? [...marks, 'HOLD'] : marks);
    const shown = held ? made.pieces.filter((piece) => piece.kind === 'copy') : made.pieces;
    pieces.push(...shown);
    losses.push(...(held ? made.losses.filter((loss) => loss.kind === 'copy') : made.losses));
    return [{ line, sending, held, route, printed: partsOf(shown, index), voided: 0 }];
  });
  const after: Tab = { ...tab, sendings: sending, lines: [...tab.lines, ...added] };
  return [after, { ...print(after, till, { kind, words: [] }, { pieces, losses }), refusals }];
};

/** The kitchen makes a line again: a new line, routed by the plan of now. */
export const remake = (work: Work, event: Extract<OrderEvent, { kind: 'remake' }>): Step => {
  const sent = work.tab.lines[event.line];
  return sent === undefined
    ? [work.tab, nothing('This line is not on the order. Nothing printed.')]
    : sendLines(work, event.till, [{ ...sent.line, quantity: event.quantity, held: false }], ['REMAKE'], 'remake');
};

