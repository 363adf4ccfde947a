import { seatWords } from './allergy-rows';
import { lineRows } from './line-rows';
import { entryOf, mergeLines } from './merge-lines';
import { wrappedRows, type Paper } from './paper';
import type { Row } from './sheet';
import type { Ticket, TicketLine } from './ticket';

/** A line's rows stay together on one page; its heading stands above the first of a page. */
export type Block = { readonly heading: readonly Row[]; readonly rows: readonly Row[] };

const bold = { emphasis: 'bold' } as const;

/** The table before the seats, seats in order, and within one as ordered. */
const bySeat = (lines: readonly TicketLine[]): readonly TicketLine[] =>
  lines.toSorted((left, right) => (left.seat ?? 0) - (right.seat ?? 0) || left.sourceLine - right.sourceLine);

const courseBlocks = (ticket: Ticket, paper: Paper): readonly Block[] =>
  ticket.courses.flatMap(({ course, lines }) => {
    const heading = wrappedRows(paper.words(course), 0, paper, bold);
    const entries = ticket.copy ? bySeat(lines).map(entryOf) : mergeLines(lines);
    return entries.map((entry) => ({ heading, rows: lineRows(entry, paper, ticket.copy ? 'before' : 'under') }));
  });

const seatBlocks = (ticket: Ticket, paper: Paper): readonly Block[] => {
  const seats = [...new Set(ticket.courses.flatMap(({ lines }) => lines.map(({ seat }) => seat)))].toSorted((left, right) => (left ?? 0) - (right ?? 0));
  return seats.flatMap((seat) => ticket.courses.flatMap(({ course, lines }) => {
    const heading = wrappedRows([seatWords(seat).toUpperCase(), paper.words(course)].filter((words) => words !== '').join(', '), 0, paper, bold);
    const own = mergeLines(lines.filter((line) => line.seat === seat));
    return own.map((entry) => ({ heading, rows: lineRows(entry, paper, 'above') }));
  }));
};

export const bodyBlocks = (ticket: Ticket, paper: Paper): readonly Block[] =>
  ticket.layout === 'by-seat' ? seatBlocks(ticket, paper) : courseBlocks(ticket, paper);
