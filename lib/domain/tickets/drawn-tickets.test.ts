import { describe, expect, it } from 'vitest';
import { aPaperPrinter, aTicket, aTicketLine } from '@/tests/fixtures/build-ticket';
import { layOutTicket } from './lay-out-ticket';
import { sheetToText } from './sheet-to-text';
import type { Ticket } from './ticket';

const nuts = { seat: 2, words: 'tree nuts' };
const sideSalad = { sourceLine: 3, seat: 4, forDish: 'House burger' };

const paperFor = (ticket: Ticket, columns = 21): string => sheetToText(layOutTicket(ticket, aPaperPrinter({ columns })));

/** Table 14: crab toast for seats 1 and 3, beetroot for 2, a burger with a side salad for 4, hake for 1 and 2, a bottle. */
describe('the tickets of one table with two courses and an allergy', () => {
  it('prints the burger at the grill, without the side salad that another station makes', () => {
    expect(paperFor(aTicket('Grill', {
      courses: [{ course: 'Mains', lines: [aTicketLine('House burger', { sourceLine: 3, seat: 4, options: [{ name: 'medium', stationCodes: [] }] })] }],
      cooksWith: ['Larder', 'Sauce'],
    }))).toBe(`\
GRILL           19:42
TABLE 14
Till 2  Ana   No 0231
---------------------
MAINS
1 HOUSE BURGER
    MEDIUM
  seat 4
---------------------
with: LARDER, SAUCE`);
  });

  it('joins two seats of one dish at the larder, and names the allergy at the head and at its line', () => {
    expect(paperFor(aTicket('Larder', {
      allergies: [nuts],
      courses: [
        {
          course: 'Starters',
          lines: [
            aTicketLine('Crab toast', { sourceLine: 0, seat: 1 }),
            aTicketLine('Crab toast', { sourceLine: 1, seat: 3 }),
            aTicketLine('Beetroot salad', { sourceLine: 2, seat: 2, note: 'no walnuts', allergies: ['tree nuts'] }),
          ],
        },
        { course: 'Mains', lines: [aTicketLine('Side salad', sideSalad)] },
      ],
      cooksWith: ['Grill', 'Sauce'],
    }))).toBe(`\
LARDER          19:42
TABLE 14
Till 2  Ana   No 0231
 ALLERGY seat 2
 TREE NUTS
---------------------
STARTERS
2 CRAB TOAST
  seats 1, 3
1 BEETROOT SALAD
    NO WALNUTS
 TREE NUTS
  seat 2
MAINS
1 SIDE SALAD
  for HOUSE BURGER
  seat 4
---------------------
with: GRILL, SAUCE`);
  });

  it('keeps a seat with an allergy apart from the same dish of another seat', () => {
    expect(paperFor(aTicket('Sauce', {
      allergies: [nuts],
      courses: [{
        course: 'Mains',
        lines: [aTicketLine('Hake brn butter', { sourceLine: 4, seat: 1 }), aTicketLine('Hake brn butter', { sourceLine: 5, seat: 2, allergies: ['tree nuts'] })],
      }],
      cooksWith: ['Grill', 'Larder'],
    }))).toBe(`\
SAUCE           19:42
TABLE 14
Till 2  Ana   No 0231
 ALLERGY seat 2
 TREE NUTS
---------------------
MAINS
1 HAKE BRN BUTTER
  seat 1
1 HAKE BRN BUTTER
 TREE NUTS
  seat 2
---------------------
with: GRILL, LARDER`);
  });

  it('says "table" for what belongs to no seat, and nothing of an allergy whose food is elsewhere', () => {
    expect(paperFor(aTicket('Bar', { courses: [{ course: 'Drinks', lines: [aTicketLine('Picpoul 75')] }] }))).toBe(`\
BAR             19:42
TABLE 14
Till 2  Ana   No 0231
---------------------
DRINKS
1 PICPOUL 75
  table`);
  });

  it('lists plates by seat on the pass copy, with the station that cooks each', () => {
    const cooked = (name: string, seat: number, code: string, sourceLine: number, more = {}) =>
      aTicketLine(name, { seat, sourceLine, stationCodes: [code], ...more });
    expect(paperFor(aTicket('Pass', {
      copy: true,
      allergies: [nuts],
      courses: [
        { course: 'Starters', lines: [cooked('Crab toast', 1, 'LD', 0), cooked('Crab toast', 3, 'LD', 1), cooked('Beetroot salad', 2, 'LD', 2, { allergies: ['tree nuts'] })] },
        {
          course: 'Mains',
          lines: [
            cooked('House burger', 4, 'GR', 3, { options: [{ name: 'side salad', stationCodes: ['LD'] }] }),
            cooked('Hake brn butter', 1, 'SC', 4), cooked('Hake brn butter', 2, 'SC', 5, { allergies: ['tree nuts'] }),
          ],
        },
      ],
    }))).toBe(`\
PASS  COPY      19:42
TABLE 14
Till 2  Ana   No 0231
 ALLERGY seat 2
 TREE NUTS
---------------------
STARTERS
s1 CRAB TOAST      LD
s2 BEETROOT SALAD  LD
 TREE NUTS
s3 CRAB TOAST      LD
MAINS
s1 HAKE BRN BUTTER SC
s2 HAKE BRN BUTTER SC
 TREE NUTS
s4 HOUSE BURGER    GR
     SIDE SALAD    LD`);
  });
});
