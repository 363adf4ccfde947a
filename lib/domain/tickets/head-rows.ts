import { headAllergyRows } from './allergy-rows';
import { cellsOf } from './cells';
import { divider, spreadRows, wrappedRows, type Paper } from './paper';
import type { Row } from './sheet';
import type { Ticket } from './ticket';

/** Which of a long ticket's pages this is. */
export type PageOf = { readonly page: number; readonly pages: number };

const spelled = ['', 'first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth', 'ninth', 'tenth'];

/** "0231, second"; the first sending needs no word. */
export const numberWords = (ticket: Pick<Ticket, 'orderNumber' | 'sending'>): string =>
  ticket.sending <= 1 ? ticket.orderNumber : `${ticket.orderNumber}, ${spelled[ticket.sending] ?? `sending ${ticket.sending}`}`;

const takenWords = { 'eat-in': '', 'take-away': 'TO TAKE AWAY', delivery: 'DELIVERY' } as const;

/** The table; a guest without one is known by how the food leaves, and failing that by the order's number. */
const placeWords = (ticket: Ticket, paper: Paper): string => {
  if (ticket.table !== '') return paper.words(`table ${ticket.table}`);
  const taken = takenWords[ticket.orderType];
  return taken === '' && ticket.orderNumber !== '' ? paper.words(`No ${ticket.orderNumber}`, 'as typed') : taken;
};

const senderRows = (ticket: Ticket, paper: Paper): readonly Row[] => {
  const sender = [ticket.till, ticket.server].map((words) => paper.words(words, 'as typed')).filter((words) => words !== '').join('  ');
  const number = ticket.orderNumber === '' ? '' : paper.words(`No ${numberWords(ticket)}`, 'as typed');
  const counted = ticket.covers === null ? sender : `${sender}  ${ticket.covers} ${ticket.covers === 1 ? 'cover' : 'covers'}`;
  return spreadRows(cellsOf(counted) + 1 + cellsOf(number) <= paper.columns ? counted : sender, number, paper);
};

const large = { emphasis: 'bold', width: 2, height: 2 } as const;
const bold = { emphasis: 'bold' } as const;

/** Everything above the first course; repeated at the top of each page. */
export const headRows = (ticket: Ticket, paper: Paper, { page, pages }: PageOf): readonly Row[] => {
  const station = `${ticket.stations.map(({ name }) => paper.words(name)).join(' + ')}${ticket.copy ? '  COPY' : ''}`;
  const taken = ticket.table === '' ? '' : takenWords[ticket.orderType];
  const { printsFor } = ticket;
  return [
    ...spreadRows(station, ticket.time, paper, bold),
    ...(printsFor === null ? [] : wrappedRows(`FOR ${paper.words(printsFor.station)}, ${paper.words(printsFor.reason, 'as typed')}`, 0, paper, bold)),
    ...ticket.event.words.flatMap((words) => wrappedRows(paper.words(words), 0, paper, large)),
    ...wrappedRows(placeWords(ticket, paper), 0, paper, large),
    ...wrappedRows(taken, 0, paper, bold),
    ...senderRows(ticket, paper),
    ...(pages === 1 ? [] : wrappedRows(`page ${page} of ${pages}`, 0, paper)),
    ...headAllergyRows(ticket.allergies, paper),
    ...(ticket.courses.length === 0 ? [] : [divider(paper)]),
  ];
};
