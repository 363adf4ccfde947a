import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import { printerDifferences, printerFacts, sayPrinterChange } from './printer-differences';
import { sayInstant } from './say-instant';
import { sayTillChange, tillDifferences, tillFacts } from './till-differences';

const grill = aPrinter('GRILL1', '10.20.30.201', { sharedPoints: [asId('switch'), asId('strip')] });
const till = aTill('Till 1', 'main', '10.20.30.61', { queues: [{ printer: asId('GRILL1'), typedName: 'GRILL1', portKind: 'tcp', portAddress: '10.20.30.201:9100', testPrintedAt: null }] });
const site = aSite({
  areas: [{ id: asId('main'), name: 'Main room', version: 1 }],
  sharedPoints: [{ id: asId('switch'), name: 'Kitchen switch', kind: 'switch' }, { id: asId('strip'), name: 'Power strip', kind: 'power-strip' }],
  printers: [grill, aPrinter('SAUCE1', '10.20.30.203')],
  tills: [till],
});

describe('what changed on a printer', () => {
  it.each([
    [{ name: 'GRILL2' }, 'GRILL1 renamed to GRILL2'],
    [{ address: '10.20.30.211' }, 'GRILL1: address 10.20.30.201 to 10.20.30.211'],
    [{ backup: asId<typeof grill.id>('SAUCE1') }, 'GRILL1: backup none to SAUCE1'],
    [{ mac: '02:54:4D:1E:AA:01', cutter: false }, 'GRILL1: MAC address nothing to 02:54:4D:1E:AA:01, cutter yes to no'],
    [{ connection: 'usb' as const, hostTill: till.id }, 'GRILL1: connection Network to USB, plugged into none to Till 1'],
    [{}, 'GRILL1 saved without a change'],
  ])('%j reads as people say it', (change, words) => {
    expect(sayPrinterChange(grill, { ...grill, ...change }, site)).toBe(words);
  });
  it('is nothing when the same lists stand in another order', () => {
    expect(printerDifferences(grill, { ...grill, sharedPoints: grill.sharedPoints.toReversed() }, site)).toEqual([]);
  });
  it('names what is gone instead of showing its number', () => {
    expect(printerDifferences(grill, { ...grill, backup: asId('x') }, site)).toMatchObject([{ to: 'one that is gone' }]);
  });
});

describe('what changed on a till', () => {
  it.each([
    [{ address: '10.20.30.71', printsThrough: null }, 'Till 1: address 10.20.30.61 to 10.20.30.71'],
    [{ queues: [] }, 'Till 1: GRILL1 taken off'],
    [{ queues: [{ ...till.queues[0]!, typedName: 'GRILL 1' }] }, 'Till 1: GRILL1 typed GRILL 1 on network 10.20.30.201:9100'],
    [{ queues: [...till.queues, { ...till.queues[0]!, printer: asId<typeof grill.id>('SAUCE1') }] }, 'Till 1: SAUCE1 installed'],
    [{ orderTypes: ['delivery' as const] }, 'Till 1: sends orders to eat in, to take away, for delivery to for delivery'],
    [{}, 'Till 1 saved without a change'],
  ])('%j reads as people say it', (change, words) => {
    expect(sayTillChange(till, { ...till, ...change }, site)).toBe(words);
  });
  it('is nothing when its printers stand in another order', () => {
    const two = { ...till, queues: [...till.queues, { ...till.queues[0]!, printer: asId<typeof grill.id>('SAUCE1') }] };
    expect(tillDifferences(two, { ...two, queues: two.queues.toReversed() }, site)).toEqual([]);
  });
});

it('puts every field into words for somebody who only reads', () => {
  expect(printerFacts(grill, site)).toContainEqual({ label: 'Hangs on', value: 'Kitchen switch, Power strip' });
  expect(tillFacts(till, site)).toContainEqual({ label: 'Prints through', value: 'itself' });
});

it('says an instant on the site’s own clock', () => {
  expect([sayInstant('2026-11-20T23:30:00.000Z', 'Europe/Dublin'), sayInstant('2026-11-20T23:30:00.000Z', 'Europe/Paris')]).toEqual(['20 Nov, 23:30', '21 Nov, 00:30']);
});
