import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { allWell } from '@/lib/domain/site/present';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { sayEvent, sayLosses } from './event-words';
import { playEvents, type Played } from './play-events';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }], tills: [aTill('till1', 'room', '10.20.30.61')],
  printers: [aPrinter('GRILL1', '10.20.30.201')], stations: [aStation('grill', ['GRILL1'], { name: 'Grill' })],
  menu: { sections: [aSection('meat')], items: [anItem('steak', 'meat', { name: 'Steak' })] },
});
const plan = aPlan([aRule('r1', 'send', { kind: 'section', section: asId('meat') }, ['grill'])]);
const order = { till: asId<never>('till1'), orderType: 'eat-in' as const, table: '4', covers: 1, server: '', number: '1', allergies: [], lines: [{ item: asId<never>('steak'), quantity: 2, options: [], seat: null, course: null, note: '', allergies: [] }] };
const event: Played['event'] = { kind: 'void', till: asId('till1'), line: 0, quantity: 1 };

describe('playing what happens to an order', () => {
  it('lays out the paper of each event, one on the other’s tab', () => {
    const { steps, tab } = playEvents(site, plan, allWell, order, [{ event, plan, present: allWell }, { event, plan, present: allWell }], { time: '19:42' });
    expect(steps.map((one) => one.paper.map(({ ticket }) => ticket.printerName))).toEqual([['GRILL1'], ['GRILL1']]);
    expect(tab.lines[0]?.voided).toBe(2);
    expect(sayEvent(site, steps[0]!, steps[0]!.tab)).toBe('1 Steak taken off');
  });

  it('says by whom a loss is not heard', () => {
    const { steps } = playEvents(site, plan, allWell, order, [{ event, plan, present: { ...allWell, downPrinters: [asId('GRILL1')] } }], { time: '19:42' });
    expect(sayLosses(site, steps[0]!)).toEqual(['Steak is not told to Grill: nobody prints there. Tell them by voice.']);
  });
});
