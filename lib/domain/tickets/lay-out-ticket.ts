import { bodyBlocks } from './body-blocks';
import { headRows } from './head-rows';
import { paginate, rowsOf } from './paginate';
import { divider, paperOf, wrappedRows, type Paper } from './paper';
import { heightOf, type Row, type TicketSheet } from './sheet';
import type { PaperPrinter, Ticket } from './ticket';

const footRows = (ticket: Ticket, paper: Paper): readonly Row[] =>
  ticket.cooksWith.length === 0 ? [] : [
    divider(paper),
    ...wrappedRows(`with: ${ticket.cooksWith.map((name) => paper.words(name)).join(', ')}`, 0, paper),
  ];

/**
 * Lays a ticket out on the grid of the printer it goes to, in characters that printer has. Nothing is cut: what does not
 * fit a row wraps, what does not fit a page goes to the next, under the same head. Same input, same sheet.
 */
export const layOutTicket = (ticket: Ticket, printer: PaperPrinter): TicketSheet => {
  const paper = paperOf(printer);
  const headHeight = heightOf(headRows(ticket, paper, { page: 1, pages: 2 }));
  const bodies = paginate(bodyBlocks(ticket, paper), headHeight);
  const pages = bodies.map((blocks, index) => ({
    rows: [
      ...headRows(ticket, paper, { page: index + 1, pages: bodies.length }),
      ...rowsOf(blocks),
      ...(index === bodies.length - 1 ? footRows(ticket, paper) : []),
    ],
  }));
  return { columns: paper.columns, emphasis: printer.emphasis, pages, times: ticket.times };
};
