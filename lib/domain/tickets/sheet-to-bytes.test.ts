import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Emphasis } from '@/lib/domain/site/printer';
import { aPaperPrinter, aTicket, aTicketLine } from '@/tests/fixtures/build-ticket';
import { decodeTicket } from '@/tests/fixtures/decode-ticket';
import { paperPrinterArbitrary, ticketArbitrary } from '@/tests/fixtures/generated-tickets';
import { layOutTicket } from './lay-out-ticket';
import { sheetToBytes } from './sheet-to-bytes';
import type { PaperPrinter, Ticket } from './ticket';

const allergicTicket = aTicket('Larder', {
  allergies: [{ seat: 2, words: 'tree nuts' }],
  courses: [{ course: 'Starters', lines: [aTicketLine('Beetroot salad', { seat: 2, allergies: ['tree nuts'] })] }],
});

const print = (ticket: Ticket, printer: PaperPrinter) => {
  const bytes = sheetToBytes(layOutTicket(ticket, printer), printer);
  return { bytes, decoded: decodeTicket(bytes, printer.codePage) };
};

const has = (bytes: Uint8Array, sought: readonly number[]): boolean => Buffer.from(bytes).includes(Buffer.from(sought));

describe('the bytes of a ticket', () => {
  it('print exactly what the picture shows, on any printer', () => {
    fc.assert(fc.property(ticketArbitrary, paperPrinterArbitrary, (ticket, printer) => {
      const sheet = layOutTicket(ticket, printer);
      const { rows, cuts, buzzes } = decodeTicket(sheetToBytes(sheet, printer), printer.codePage);
      const shown = Array.from({ length: sheet.times }, () => sheet.pages.flatMap((page) => page.rows)).flat();
      const flat = (runs: readonly { readonly text: string; readonly bold: boolean; readonly allergy: boolean; readonly width: number; readonly height: number }[]) =>
        runs.flatMap(({ text, ...style }) => [...text].map((character) => ({ character, ...style })));
      expect(rows.map(flat)).toEqual(shown.map(({ runs }) => flat(runs.map(({ text, emphasis, width, height }) => ({
        text, width, height, bold: emphasis !== 'none', allergy: emphasis === 'allergy' && printer.emphasis !== 'frame',
      })))));
      expect(cuts).toBe(printer.cutter ? sheet.times * sheet.pages.length : 0);
      expect(buzzes).toBe(printer.buzzer ? 1 : 0);
    }), { seed: 20261201, numRuns: 200 });
  });

  it('are the same for the same ticket', () => {
    fc.assert(fc.property(ticketArbitrary, paperPrinterArbitrary, (ticket, printer) => {
      expect(print(structuredClone(ticket), printer).bytes).toEqual(print(ticket, printer).bytes);
    }), { seed: 20261201, numRuns: 50 });
  });

  it.each([
    ['inverse', [0x1d, 0x42, 1], [0x1d, 0x42, 0]],
    ['red', [0x1b, 0x72, 1], [0x1b, 0x72, 0]],
  ] as const)('make an allergy stand out in %s and put the printer back', (emphasis, on, off) => {
    const { bytes, decoded } = print(allergicTicket, aPaperPrinter({ emphasis }));
    expect(has(bytes, on) && has(bytes, off)).toBe(true);
    expect(decoded.rows.flat().filter(({ allergy }) => allergy).map(({ text }) => text.trim())).toEqual(['ALLERGY seat 2', 'TREE NUTS', 'TREE NUTS']);
  });

  it('frame an allergy in double width where a printer has neither', () => {
    const rows = print(allergicTicket, aPaperPrinter({ emphasis: 'frame' })).decoded.rows.map((runs) => runs.map(({ text }) => text).join(''));
    expect(rows.slice(3, 8)).toEqual(['┌──────────────────┐', '│ALLERGY  │', '│seat 2   │', '│TREE NUTS│', '└──────────────────┘']);
  });

  it('draw the frame in plain signs where the code page has no lines', () => {
    const rows = print(allergicTicket, aPaperPrinter({ emphasis: 'frame', codePage: 'windows-1252' })).decoded.rows.map((runs) => runs.map(({ text }) => text).join(''));
    expect(rows[3]).toBe('+------------------+');
  });

  it.each([
    ['cp437', 0], ['cp850', 2], ['windows-1252', 16], ['cp866', 17], ['cp852', 18], ['cp858', 19],
  ] as const)('choose %s by the number in the public command manuals', (codePage, number) => {
    expect(print(allergicTicket, aPaperPrinter({ codePage })).decoded.codePageNumber).toBe(number);
  });

  it('feed to the blade before the cut, and to the tear bar without a cutter', () => {
    expect(print(allergicTicket, aPaperPrinter()).bytes.slice(-4)).toEqual(Uint8Array.of(0x1d, 0x56, 0x42, 0));
    expect(print(allergicTicket, aPaperPrinter({ cutter: false })).bytes.slice(-3)).toEqual(Uint8Array.of(0x1b, 0x64, 5));
  });

  it('never let a name or a note give the printer a command', () => {
    const hostile = aTicket('Grill', { server: '\u001d!\u0033', courses: [{ course: 'Mains', lines: [aTicketLine('Steak\u001b@', { note: '\u001dV\u0000 cut here\n\n' })] }] });
    for (const emphasis of ['inverse', 'red', 'frame'] satisfies Emphasis[]) {
      const { decoded } = print(hostile, aPaperPrinter({ emphasis }));
      expect(decoded.cuts).toBe(1);
      expect(decoded.rows.flat().map(({ text }) => text).join('\n')).toContain('STEAK@');
    }
  });
});
