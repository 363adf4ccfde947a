import { describe, expect, it } from 'vitest';
import { aPaperPrinter, aTicket, aTicketLine } from '@/tests/fixtures/build-ticket';
import { layOutTicket } from './lay-out-ticket';
import { longestPageRows } from './paginate';
import { heightOf } from './sheet';
import { sheetToText } from './sheet-to-text';
import type { Ticket, TicketLine } from './ticket';

const rowsFor = (ticket: Ticket, columns = 32): readonly string[] => sheetToText(layOutTicket(ticket, aPaperPrinter({ columns }))).split('\n');
const dishRows = (...lines: readonly TicketLine[]): readonly string[] => rowsFor(aTicket('Grill', { courses: [{ course: 'Mains', lines }] })).slice(5);

describe('a line on a ticket', () => {
  it('wraps a long name at its words, hung under the name', () => {
    expect(dishRows(aTicketLine('Slow roast shoulder of hogget with anchovy', { quantity: 12, seat: 3 }))).toEqual([
      '12 SLOW ROAST SHOULDER OF HOGGET', '   WITH ANCHOVY', '   seat 3',
    ]);
  });

  it('breaks a word only when no row could hold it', () => {
    expect(dishRows(aTicketLine('Donaudampfschifffahrtskapitänsteller'))).toEqual(['1 DONAUDAMPFSCHIFFFAHRTSKAPITÄNS', '  TELLER', '  table']);
  });

  it('puts quantity and name first, then options, its dish, the note, the allergy and the seat', () => {
    expect(dishRows(aTicketLine('Side salad', {
      quantity: 3, options: [{ name: 'no onion', stationCodes: [] }], forDish: 'House burger', note: 'dressing apart', allergies: ['mustard', 'eggs'], seat: 2,
    }))).toEqual(['3 SIDE SALAD', '    NO ONION', '  for HOUSE BURGER', '    DRESSING APART', ' MUSTARD', ' EGGS', '  seat 2']);
  });

  it.each([
    [[[1, 1], [3, 1]], '2 CRAB TOAST', '  seats 1, 3'],
    [[[1, 2], [3, 1]], '3 CRAB TOAST', '  seats 1 (2), 3 (1)'],
    [[[null, 2], [4, 1]], '3 CRAB TOAST', '  table (2), seat 4 (1)'],
    [[[2, 1], [2, 2]], '3 CRAB TOAST', '  seat 2'],
  ] as const)('joins the portions %j of one dish', (portions, first, second) => {
    expect(dishRows(...portions.map(([seat, quantity], sourceLine) => aTicketLine('Crab toast', { seat, quantity, sourceLine })))).toEqual([first, second]);
  });

  it('sets a mark before the name', () => {
    expect(dishRows(aTicketLine('Flan', { marks: ['VOID'], quantity: 2 }))[0]).toBe('2 VOID: FLAN');
  });
});

describe('the head of a ticket', () => {
  it('says for whom a backup prints, and why', () => {
    expect(rowsFor(aTicket('Grill', { printsFor: { station: 'Grill', reason: 'GRILL1 is down' } }))[1]).toBe('FOR GRILL, GRILL1 is down');
  });

  it('numbers a later sending in words', () => {
    expect(rowsFor(aTicket('Grill', { sending: 2 }))[2]).toBe('Till 2  Ana      No 0231, second');
  });

  it('shows how the food leaves, large where there is no table', () => {
    expect(rowsFor(aTicket('Grill', { orderType: 'take-away', table: '' }))[1]).toBe('TO TAKE AWAY');
    expect(rowsFor(aTicket('Grill', { orderType: 'delivery', table: '9' })).slice(1, 3)).toEqual(['TABLE 9', 'DELIVERY']);
    expect(rowsFor(aTicket('Grill', { table: '' }))[1]).toBe('No 0231');
  });

  it('says loudly what a later event is about', () => {
    expect(rowsFor(aTicket('Grill', { event: { kind: 'fire', words: ['Mains away'] } }))[1]).toBe('MAINS AWAY');
  });

  it('tells what was said of the table before what was said of a seat', () => {
    expect(rowsFor(aTicket('Grill', { allergies: [{ seat: 2, words: 'milk' }, { seat: null, words: 'nuts' }, { seat: 2, words: 'eggs' }] })).slice(3))
      .toEqual([' ALLERGY table', ' NUTS', ' ALLERGY seat 2', ' MILK', ' EGGS']);
  });

  it('names all stations that a joined printer serves, and who cooks each line', () => {
    const rows = rowsFor(aTicket('Grill', {
      stations: [{ id: 'grill' as never, code: 'GR', name: 'Grill' }, { id: 'sauce' as never, code: 'SC', name: 'Sauce' }],
      courses: [{ course: 'Mains', lines: [aTicketLine('Mixed grill', { stationCodes: ['GR', 'SC'] })] }],
    }));
    expect([rows[0], rows[5]]).toEqual(['GRILL + SAUCE              19:42', '1 MIXED GRILL              GR SC']);
  });
});

describe('a ticket by seat', () => {
  it('heads each seat and its course, the table first', () => {
    const rows = rowsFor(aTicket('Grill', {
      layout: 'by-seat',
      courses: [{ course: 'Starters', lines: [aTicketLine('Crab toast', { seat: 2 }), aTicketLine('Bread', { sourceLine: 1 })] }, { course: 'Mains', lines: [aTicketLine('Hake', { seat: 2, sourceLine: 2 })] }],
    }));
    expect(rows.slice(4)).toEqual(['TABLE, STARTERS', '1 BREAD', 'SEAT 2, STARTERS', '1 CRAB TOAST', 'SEAT 2, MAINS', '1 HAKE']);
  });
});

describe('a long ticket', () => {
  const lines = Array.from({ length: 70 }, (_, sourceLine) => aTicketLine(`Dish ${sourceLine}`, { sourceLine, seat: 1, allergies: sourceLine === 0 ? ['nuts'] : [] }));
  const sheet = layOutTicket(aTicket('Grill', { allergies: [{ seat: 1, words: 'nuts' }], courses: [{ course: 'Mains', lines }], cooksWith: ['Larder'] }), aPaperPrinter());
  const texts = sheetToText(sheet).split('\f');

  it('goes on over numbered pages, each with the head, the allergy and the course', () => {
    expect(texts).toHaveLength(3);
    texts.forEach((text, index) => {
      expect(text).toContain(`page ${index + 1} of 3`);
      for (const words of ['TABLE 14', 'ALLERGY seat 1', 'MAINS']) expect(text).toContain(words);
    });
    for (const { rows } of sheet.pages.slice(0, -1)) expect(heightOf(rows)).toBeLessThanOrEqual(longestPageRows);
  });

  it('says who else cooks once, at its end', () => {
    expect(texts.filter((text) => text.includes('with: LARDER'))).toEqual([texts.at(-1)]);
  });
});
