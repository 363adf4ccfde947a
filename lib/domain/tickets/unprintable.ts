import { columnsOf } from './paper';
import { printable, type Replaced } from './printable';
import type { PaperPrinter, Ticket } from './ticket';
import { wordsBroken } from './wrap';

/** A character that a ticket needs and its printer does not have. */
export type Unprintable = Replaced & {
  /** The words it stands in, as typed. */
  readonly where: string;
  /** An allergy must print as it was said: this one may not go live. */
  readonly allergy: boolean;
};

type TicketText = { readonly words: string; readonly allergy: boolean; readonly letterCase: 'capitals' | 'as typed' };

const textsOf = (ticket: Ticket): readonly TicketText[] => {
  const lines = ticket.courses.flatMap((course) => course.lines);
  const plain = [
    ...ticket.stations.map(({ name }) => name), ...ticket.event.words, ticket.table, ticket.printsFor?.station ?? '',
    ...ticket.courses.map(({ course }) => course), ...ticket.cooksWith,
    ...lines.flatMap((line) => [line.name, ...line.options.map(({ name }) => name), line.forDish ?? '', line.note]),
  ];
  return [
    ...[...ticket.allergies.map(({ words }) => words), ...lines.flatMap(({ allergies }) => allergies)]
      .map((words): TicketText => ({ words, allergy: true, letterCase: 'capitals' })),
    ...plain.map((words): TicketText => ({ words, allergy: false, letterCase: 'capitals' })),
    ...[ticket.till, ticket.server, ticket.orderNumber, ticket.printsFor?.reason ?? ''].map((words): TicketText => ({ words, allergy: false, letterCase: 'as typed' })),
  ];
};

/** Every character of a ticket that its printer replaces, once for each text it stands in, allergies first. */
export const unprintable = (ticket: Ticket, printer: Pick<PaperPrinter, 'codePage'>): readonly Unprintable[] => {
  const found = new Map<string, Unprintable>();
  for (const { words, allergy, letterCase } of textsOf(ticket)) {
    for (const replaced of printable(words, printer.codePage, letterCase).replaced) {
      found.set(JSON.stringify([words, replaced.character, allergy]), { ...replaced, where: words, allergy });
    }
  }
  return [...found.values()];
};

/** What a name would suffer on a printer's tickets: a character replaced, or a word longer than a row broken inside. */
export type TextProblem =
  | ({ readonly kind: 'character' } & Replaced)
  | { readonly kind: 'word-broken'; readonly word: string; readonly columns: number };

/** Cells that a name loses to the quantity before it. */
const quantityCells = 2;

/** Checks one name, option or allergy against one printer, without a ticket around it. */
export const checkTicketText = (words: string, printer: Pick<PaperPrinter, 'codePage' | 'columns'>): readonly TextProblem[] => {
  const printed = printable(words, printer.codePage, 'capitals');
  const columns = columnsOf(printer) - quantityCells;
  return [
    ...printed.replaced.map((replaced): TextProblem => ({ kind: 'character', ...replaced })),
    ...wordsBroken(printed.text, columns).map((word): TextProblem => ({ kind: 'word-broken', word, columns })),
  ];
};
