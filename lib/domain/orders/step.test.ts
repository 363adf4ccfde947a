import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { allWell, type Present } from '@/lib/domain/site/present';
import type { Plan } from '@/lib/domain/site/plan';
import type { Ticket } from '@/lib/domain/tickets/ticket';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import type { OrderEvent } from './event';
import type { Order, OrderLine } from './order';
import { step, type Kitchen, type Printed } from './step';
import type { Tab } from './tab';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }, { id: asId('terrace'), name: 'Terrace', version: 1 }],
  courses: [{ id: asId('mains'), name: 'Mains' }, { id: asId('desserts'), name: 'Desserts' }],
  tills: [aTill('till1', 'room', '10.20.30.61', { name: 'Till 1' }), aTill('till2', 'terrace', '10.20.30.62', { name: 'Terrace' })],
  printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('SAUCE1') }), aPrinter('LARDER1', '10.20.30.202'), aPrinter('SAUCE1', '10.20.30.203'), aPrinter('PASTRY1', '10.20.30.204'), aPrinter('PASS1', '10.20.30.210')],
  stations: [
    aStation('grill', ['GRILL1'], { name: 'Grill', code: 'GR' }), aStation('larder', ['LARDER1'], { name: 'Larder', code: 'LD', position: 1 }),
    aStation('sauce', ['SAUCE1'], { name: 'Sauce', code: 'SC', position: 2 }), aStation('pastry', ['PASTRY1'], { name: 'Pastry', code: 'PY', position: 3, standIn: asId('larder') }),
    aStation('pass', ['PASS1'], { name: 'Pass', code: 'AS', kind: 'pass', position: 4 }),
  ],
  menu: {
    sections: [aSection('burgers'), aSection('sweet')],
    items: [anItem('burger', 'burgers', { name: 'House burger', course: asId('mains'), optionGroups: [asId('sides')] }), anItem('tart', 'sweet', { name: 'Lemon tart', course: asId('desserts') })],
    optionGroups: [aGroup('sides', ['side', 'chips'], { max: 2 })],
    options: [anOption('side', 'sides', { name: 'Side salad' }), anOption('chips', 'sides', { name: 'Chips' })],
  },
});
const burgersTo = (station: string, more = {}) => aRule(`burgers-${station}`, 'send', { kind: 'section', section: asId('burgers') }, [station], more);
const shared = [aRule('sweet', 'send', { kind: 'section', section: asId('sweet') }, ['pastry']), aRule('side', 'split', { kind: 'option', option: asId('side') }, ['larder']), aRule('all', 'copy', { kind: 'everything' }, ['pass'])];
const dinner = aPlan([burgersTo('grill'), ...shared]);
const changed = aPlan([burgersTo('sauce'), ...shared]);

const aLine = (item: string, more: Partial<OrderLine> = {}): OrderLine => ({ item: asId(item), quantity: 1, options: [], seat: 1, course: null, note: '', allergies: [], ...more });
const anOrder = (lines: readonly OrderLine[]): Order => ({ till: asId('till1'), orderType: 'eat-in', table: '14', covers: 2, server: 'Ana', number: '0231', lines, allergies: [] });
const kitchen = (plan: Plan = dinner, present: Partial<Present> = {}): Kitchen => ({ site, plan, present: { ...allWell, ...present }, clock: { time: '19:42' } });

const sent = (lines: readonly OrderLine[]): Tab => step(kitchen(), null, { kind: 'send', order: anOrder(lines) })[0];
const linesOf = (ticket: Ticket): readonly string[] => ticket.courses.flatMap((course) => course.lines.map((line) => [line.quantity, line.name, ...line.marks].join(' ')));
/** "PRINTER: line, line" for each ticket, in the order they come out. */
const paper = ({ tickets }: Printed): readonly string[] => tickets.map((ticket) => `${ticket.printerName}: ${[...linesOf(ticket), ...(ticket.event.kind === 'message' ? ticket.event.words : [])].join(', ')}`);
const after = (tab: Tab, event: OrderEvent, now: Kitchen = kitchen()): Printed => step(now, tab, event)[1];
const till1 = asId<never>('till1');
const till2 = asId<never>('till2');
const withSide = aLine('burger', { quantity: 2, options: [asId('side')] });
const heldTart = aLine('tart', { held: true });

describe('events of an order', () => {
  it('sends a held line to the pass alone, marked HOLD', () => {
    expect(paper(step(kitchen(), null, { kind: 'send', order: anOrder([aLine('burger'), heldTart]) })[1]))
      .toEqual(['GRILL1: 1 House burger', 'PASS1: 1 House burger, 1 Lemon tart HOLD']);
  });

  it('fires a held dessert to whoever stands in by then', () => {
    expect(paper(after(sent([heldTart]), { kind: 'fire', till: till1, course: asId('desserts') }, kitchen(dinner, { closedStations: [asId('pastry')] }))))
      .toEqual(['LARDER1: 1 Lemon tart', 'PASS1: 1 Lemon tart']);
  });

  it('fires by the rules of the sending even when the plan has changed', () => {
    const tab = sent([aLine('burger', { held: true })]);
    expect(paper(after(tab, { kind: 'fire', till: till1, course: null }, kitchen(changed)))).toEqual(['GRILL1: 1 House burger', 'PASS1: 1 House burger']);
  });

  it('does not fire twice', () => {
    const [fired] = step(kitchen(), sent([heldTart]), { kind: 'fire', till: till1, course: null });
    expect(after(fired, { kind: 'fire', till: till1, course: null })).toEqual({ tickets: [], losses: [], refusals: ['Nothing is held for All. Nothing printed.'] });
  });

  it('prints a void where the original printed, split options included, whatever the plan says by now', () => {
    expect(paper(after(sent([withSide]), { kind: 'void', till: till1, line: 0, quantity: 1 }, kitchen(changed))))
      .toEqual(['GRILL1: 1 House burger VOID', 'LARDER1: 1 Side salad VOID', 'PASS1: 1 House burger VOID']);
  });

  it('follows a printer that is out to its backup, and says for whom it prints', () => {
    const printed = after(sent([aLine('burger')]), { kind: 'void', till: till1, line: 0, quantity: 1 }, kitchen(dinner, { downPrinters: [asId('GRILL1')] }));
    expect(paper(printed)).toEqual(['PASS1: 1 House burger VOID', 'SAUCE1: 1 House burger VOID']);
    expect(printed.tickets[1]?.printsFor).toEqual({ station: 'Grill', reason: 'GRILL1 is down' });
  });

  it('reports a void lost when nobody prints for that printer any more', () => {
    const { losses } = after(sent([withSide]), { kind: 'void', till: till1, line: 0, quantity: 2 }, kitchen(dinner, { downPrinters: [asId('LARDER1')] }));
    expect(losses).toEqual([{ sourceLine: 0, kind: 'split', option: 'side', station: 'larder' }]);
  });

  it('voids a line that was never fired at the pass only', () => {
    expect(paper(after(sent([heldTart]), { kind: 'void', till: till1, line: 0, quantity: 1 }))).toEqual(['PASS1: 1 Lemon tart VOID HOLD']);
  });

  it('refuses to void more than is left', () => {
    const [once] = step(kitchen(), sent([withSide]), { kind: 'void', till: till1, line: 0, quantity: 1 });
    expect(after(once, { kind: 'void', till: till1, line: 0, quantity: 2 }).refusals).toEqual(['Only 1 can be taken off. Nothing printed.']);
  });

  it('amends loudly on every printer that printed the line', () => {
    const printed = after(sent([withSide]), { kind: 'amend', till: till1, line: 0, allergies: ['TREE NUTS'] }, kitchen(changed));
    expect(paper(printed)).toEqual(['GRILL1: 2 House burger AMENDED', 'LARDER1: 2 Side salad AMENDED', 'PASS1: 2 House burger AMENDED']);
    expect(printed.tickets.every((ticket) => ticket.allergies.some((allergy) => allergy.words === 'TREE NUTS'))).toBe(true);
  });

  it('voids an option taken off late, and sends one chosen late to who makes it', () => {
    expect(paper(after(sent([withSide]), { kind: 'amend', till: till1, line: 0, options: [asId('chips')] })))
      .toEqual(['GRILL1: 2 House burger AMENDED', 'LARDER1: 2 Side salad VOID', 'PASS1: 2 House burger AMENDED']);
    expect(paper(after(sent([aLine('burger')]), { kind: 'amend', till: till1, line: 0, options: [asId('side')] })))
      .toEqual(['GRILL1: 1 House burger AMENDED', 'LARDER1: 1 Side salad AMENDED', 'PASS1: 1 House burger AMENDED']);
  });

  it('keeps the routing of sent lines after a move, and uses the new area for later ones', () => {
    const terrace = aPlan([burgersTo('grill'), burgersTo('sauce', { areas: [asId('terrace')] }), ...shared]);
    const [moved, printed] = step(kitchen(terrace), sent([aLine('burger')]), { kind: 'move', till: till1, table: '40', area: asId('terrace') });
    expect(paper(printed)).toEqual(['GRILL1: 1 House burger', 'PASS1: 1 House burger']);
    expect(printed.tickets[0]).toMatchObject({ table: '40', event: { kind: 'move', words: ['Moved from table 14'] } });
    expect(paper(after(moved, { kind: 'add', till: till2, lines: [aLine('burger')], allergies: [] }, kitchen(terrace)))).toEqual(['PASS1: 1 House burger', 'SAUCE1: 1 House burger']);
  });

  it('numbers every addition as a new sending', () => {
    const [, printed] = step(kitchen(), sent([aLine('burger')]), { kind: 'add', till: till1, lines: [aLine('burger')], allergies: [] });
    expect(printed.tickets.map((ticket) => ticket.sending)).toEqual([2, 2]);
  });

  it('reprints a sending where it printed, and remakes a line by the plan of now', () => {
    const tab = sent([aLine('burger')]);
    expect(paper(after(tab, { kind: 'reprint', till: till1, sending: 1 }, kitchen(changed)))).toEqual(['GRILL1: 1 House burger REPRINT', 'PASS1: 1 House burger REPRINT']);
    expect(paper(after(tab, { kind: 'remake', till: till1, line: 0, quantity: 1 }, kitchen(changed)))).toEqual(['PASS1: 1 House burger REMAKE', 'SAUCE1: 1 House burger REMAKE']);
  });

  it('rushes what has been fired, and leaves what is held in peace', () => {
    expect(paper(after(sent([aLine('burger'), heldTart]), { kind: 'rush', till: till1, course: null }))).toEqual(['GRILL1: 1 House burger RUSH', 'PASS1: 1 House burger RUSH']);
  });

  it('takes a message to who stands in, or says to tell them by voice', () => {
    const message: OrderEvent = { kind: 'message', till: till1, station: asId('pastry'), words: 'No more mint' };
    expect(paper(after(sent([heldTart]), message, kitchen(dinner, { closedStations: [asId('pastry')] })))).toEqual(['LARDER1: No more mint']);
    expect(after(sent([heldTart]), message, kitchen(dinner, { downPrinters: [asId('PASTRY1')] })).refusals[0]).toContain('Tell them by voice.');
  });

  it('tells the stations of a joining table its new number', () => {
    const other = { ...sent([aLine('burger')]), table: '12' };
    const [joined, printed] = step(kitchen(), sent([heldTart]), { kind: 'merge', till: till1, other });
    expect(joined.lines).toHaveLength(2);
    expect(printed.tickets.map((ticket) => [ticket.printerName, ticket.event.words])).toEqual([['GRILL1', ['Table 12 joins table 14']], ['PASS1', ['Table 12 joins table 14']]]);
  });
});
