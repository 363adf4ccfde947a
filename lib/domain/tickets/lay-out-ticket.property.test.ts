import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { paperPrinterArbitrary, ticketArbitrary } from '@/tests/fixtures/generated-tickets';
import { cellsOf } from './cells';
import { isInCodePage } from './code-pages';
import { layOutTicket } from './lay-out-ticket';
import { printable } from './printable';
import type { TicketSheet } from './sheet';
import type { PaperPrinter, Ticket } from './ticket';

const fixed = { seed: 20261201, numRuns: 300 };

const holds = (guarantee: (sheet: TicketSheet, ticket: Ticket, printer: PaperPrinter) => void): void => {
  fc.assert(fc.property(ticketArbitrary, paperPrinterArbitrary, (ticket, printer) => {
    guarantee(layOutTicket(ticket, printer), ticket, printer);
  }), fixed);
};

const rowsOf = (sheet: TicketSheet) => sheet.pages.flatMap(({ rows }) => rows);
const runsOf = (sheet: TicketSheet) => rowsOf(sheet).flatMap(({ runs }) => runs);
const squeezed = (text: string): string => text.replace(/[\s│┌┐└┘─|+]/g, '');
const linesOf = (ticket: Ticket) => ticket.courses.flatMap(({ lines }) => lines);
const asPrinted = (words: string, printer: PaperPrinter): string => squeezed(printable(words, printer.codePage, 'capitals').text);

describe('a ticket on any printer', () => {
  it('has no row wider than the paper', () => {
    holds((sheet) => {
      for (const { runs } of rowsOf(sheet)) {
        expect(runs.reduce((cells, { text, width }) => cells + cellsOf(text) * width, 0)).toBeLessThanOrEqual(sheet.columns);
      }
    });
  });

  it('holds only characters that the printer has, and none that it could take for a command', () => {
    holds((sheet, _, printer) => {
      for (const { text } of runsOf(sheet)) {
        expect(isInCodePage(text, printer.codePage)).toBe(true);
        expect(text).not.toMatch(/\p{Cc}|\p{Cf}/u);
      }
    });
  });

  it('names every allergy at the head of every page and again at its line, whole', () => {
    holds((sheet, ticket, printer) => {
      const marked = (rows: TicketSheet['pages'][number]['rows']): string =>
        squeezed(rows.flatMap(({ runs }) => runs).filter(({ emphasis }) => emphasis === 'allergy').map(({ text }) => text).join(''));
      for (const page of sheet.pages) {
        for (const { words } of ticket.allergies) expect(marked(page.rows)).toContain(asPrinted(words, printer));
      }
      const all = marked(sheet.pages.flatMap(({ rows }) => rows));
      for (const words of new Set(ticket.allergies.map((allergy) => asPrinted(allergy.words, printer)))) {
        expect(all.split(words).length - 1).toBeGreaterThanOrEqual(sheet.pages.length + 1);
      }
    });
  });

  it('gives the allergy emphasis to nothing else', () => {
    holds((sheet, ticket, printer) => {
      const marked = runsOf({ ...layOutTicket({ ...ticket, allergies: [], courses: ticket.courses.map(({ course, lines }) => ({ course, lines: lines.map((line) => ({ ...line, allergies: [] })) })) }, printer) });
      expect(marked.filter(({ emphasis }) => emphasis === 'allergy')).toEqual([]);
      expect(runsOf(sheet).some(({ emphasis }) => emphasis === 'allergy')).toBe(ticket.allergies.length > 0);
    });
  });

  it('prints every name, option, dish and note to its last character', () => {
    holds((sheet, ticket, printer) => {
      const paper = squeezed(runsOf(sheet).map(({ text }) => text).join(''));
      for (const line of linesOf(ticket)) {
        const texts = [line.name, line.forDish ?? '', line.note, ...line.options.map(({ name }) => name)];
        for (const words of texts) expect(paper).toContain(asPrinted(words, printer));
      }
    });
  });

  it('says which order line each name belongs to, and prints the ordered quantities', () => {
    holds((sheet, ticket) => {
      const shown = new Set(runsOf(sheet).flatMap(({ sourceLines }) => sourceLines));
      expect([...shown].toSorted()).toEqual(linesOf(ticket).map(({ sourceLine }) => sourceLine).toSorted());
      if (ticket.copy || ticket.layout === 'by-seat') return;
      const ordered = linesOf(ticket).reduce((sum, { quantity }) => sum + quantity, 0);
      const heads = new Map(rowsOf(sheet).flatMap(({ runs }) => runs.filter(({ sourceLines }) => sourceLines.length > 0).slice(0, 1)
        .map((each) => [each.sourceLines.join(), each.text] as const)).toReversed());
      expect([...heads.values()].reduce((sum, text) => sum + Number.parseInt(text, 10), 0)).toBe(ordered);
    });
  });

  it('comes out the same every time', () => {
    holds((sheet, ticket, printer) => expect(layOutTicket(structuredClone(ticket), printer)).toEqual(sheet));
  });
});
