import { asId, type PrinterId, type TillId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import type { Queue, Till } from '@/lib/domain/site/till';
import { lanternYardMenu } from './menu';
import { lanternYardPlans, liveVersion } from './plans';

const id = <Id extends string>(kind: string, name: string): Id => asId<Id>(`ly-${kind}-${name}`);
const mask = '255.255.255.0';

const printer = (name: string, key: string, last: number, more: Partial<Printer>): Printer => ({
  id: id('p', key), name, model: 'Thermal, 80 mm, with cutter', serial: `LY-${1000 + last}`, connection: 'network', hostTill: null,
  address: `10.20.30.${last}`, mask, gateway: '10.20.30.1', port: 9100, mac: `02:00:5E:10:30:${last.toString(16).toUpperCase().padStart(2, '0')}`, presentAddress: '',
  rollWidthMm: 80, columns: 48, codePage: 'cp858', emphasis: 'inverse', cutter: true, buzzer: true, backup: null, joinsStations: false,
  sharedPoints: [id('x', 'kitchen-switch')], stage: 'tested', downSince: null, downReason: '', version: 1, ...more,
});

/** LARDER 1 has a space in its name, and PASTRY1 has never printed: two of the mistakes that are there to be found. */
const printers: readonly Printer[] = [
  printer('GRILL1', 'grill1', 201, { backup: id('p', 'sauce1'), stage: 'signed-off' }),
  printer('LARDER 1', 'larder1', 202, { stage: 'reachable' }),
  printer('SAUCE1', 'sauce1', 203, { backup: id('p', 'grill1') }),
  printer('PASTRY1', 'pastry1', 204, { backup: id('p', 'pass1'), stage: 'addressed' }),
  printer('BAR1', 'bar1', 205, { stage: 'signed-off', sharedPoints: [id('x', 'bar-switch')] }),
  printer('PASS1', 'pass1', 210, { backup: id('p', 'sauce1'), stage: 'reachable', sharedPoints: [id('x', 'kitchen-switch'), id('x', 'pass-strip')] }),
  printer('BAR2', 'bar2', 206, {
    connection: 'usb', hostTill: id('t', 'terrace'), address: '', mask: '', gateway: '', mac: '', model: 'Thermal, 58 mm', rollWidthMm: 58, columns: 32, cutter: false,
    stage: 'signed-off', sharedPoints: [],
  }),
];

const tested = '2026-11-24T10:30:00.000Z';

const queuesOn = (till: string): readonly Queue[] => printers
  .filter((one) => one.connection === 'network' || one.hostTill === `ly-t-${till}`)
  .map((one): Queue => {
    if (one.connection === 'usb') return { printer: one.id, typedName: one.name, portKind: 'usb', portAddress: 'USB001', testPrintedAt: tested };
    const parallel = till === 'till-3' && one.name === 'PASS1';
    return {
      printer: one.id, typedName: one.name, portKind: parallel ? 'parallel' : 'tcp', portAddress: parallel ? 'LPT1:' : `${one.address}:9100`,
      testPrintedAt: parallel || one.name === 'PASTRY1' ? null : tested,
    };
  });

const till = (name: string, key: string, area: string, last: number, points: readonly string[]): Till => ({
  id: id('t', key), name, kind: 'fixed', area: id('a', area), orderTypes: [...orderTypes], system: 'windows', address: `10.20.30.${last}`, mask, addressSource: 'static',
  adapter: 'Ethernet', sharedPoints: points.map((point) => id('x', point)), defaultPrinter: null, printsThrough: null, queues: queuesOn(key), version: 1,
});

/**
 * A code differs from every other in both letters, so that half a stamp still tells. Bar would share its R with Grill as
 * BR, and Pass its P with Pastry as PA: they are BA and AS.
 */
const station = (name: string, code: string, key: string, position: number, own: readonly string[], more: Partial<Station>): Station => ({
  id: id('st', key), name, code, kind: 'prep', mesh: 'square', colour: 'brick', position, printers: own.map((one) => id<PrinterId>('p', one)), open: true, standIn: null,
  layout: 'by-course', ticketsPerSending: 1, pace: 12, version: 1, ...more,
});

const stations: readonly Station[] = [
  station('Grill', 'GR', 'grill', 0, ['grill1'], { mesh: 'square', colour: 'brick', standIn: id('st', 'sauce'), pace: 14 }),
  station('Larder', 'LD', 'larder', 1, ['larder1'], { mesh: 'diagonal', colour: 'slate', pace: 18 }),
  station('Sauce', 'SC', 'sauce', 2, ['sauce1'], { mesh: 'dots', colour: 'aubergine', standIn: id('st', 'grill'), pace: 14 }),
  station('Pastry', 'PY', 'pastry', 3, ['pastry1'], { mesh: 'bars', colour: 'mustard', standIn: id('st', 'larder'), pace: 16 }),
  station('Bar', 'BA', 'bar', 4, ['bar2', 'bar1'], { mesh: 'diamond', colour: 'pine', pace: 40 }),
  station('Pass', 'AS', 'pass', 5, ['pass1'], { kind: 'pass', mesh: 'lines', colour: 'iron', layout: 'by-seat', pace: null }),
];

const tills: readonly Till[] = [
  till('Till 1', 'till-1', 'main', 61, ['kitchen-switch']), till('Till 2', 'till-2', 'main', 62, ['kitchen-switch']), till('Till 3', 'till-3', 'main', 63, ['bar-switch']),
  till('Terrace', 'terrace', 'terrace', 64, ['bar-switch']), till('Counter', 'counter', 'bar', 65, ['bar-switch']),
];

/** A neighbourhood restaurant that does not exist, of the size of a real one, with mistakes to be found. */
export const lanternYard: Site = {
  id: asId('lantern-yard'), name: 'Lantern Yard', place: 'Portmere', timeZone: 'Europe/Dublin', language: 'en', version: 1,
  network: { subnet: '10.20.30.0/24', gateway: '10.20.30.1', poolFrom: '10.20.30.100', poolTo: '10.20.30.150', reserved: [{ address: '10.20.30.2', reason: 'Switch in the kitchen' }, { address: '10.20.30.3', reason: 'Switch at the bar' }] },
  namingPolicy: { minLength: 2, maxLength: 12, allowUnderscore: true, allowHyphen: true, mustStartWithLetter: true },
  follows: 'by-hand', link: { kind: 'none' },
  contacts: [
    { kind: 'installer', name: 'Femi Lindqvist', phone: '+00 0000 000101', email: 'femi@lindqvist-onsite.example' },
    { kind: 'network', name: 'Portmere Net, night desk', phone: '+00 0000 000102', email: 'desk@portmere-net.example' },
    { kind: 'electrician', name: 'Halloran Electrical', phone: '+00 0000 000103', email: 'hello@halloran-electrical.example' },
  ],
  courses: ['Drinks', 'Starters', 'Mains', 'Desserts'].map((name) => ({ id: id('c', name.toLowerCase()), name })),
  sharedPoints: [
    { id: id('x', 'kitchen-switch'), name: 'Switch in the kitchen', kind: 'switch' }, { id: id('x', 'bar-switch'), name: 'Switch at the bar', kind: 'switch' },
    { id: id('x', 'pass-strip'), name: 'Power strip under the pass', kind: 'power-strip' },
  ],
  areas: [{ id: id('a', 'main'), name: 'Main room', version: 1 }, { id: id('a', 'terrace'), name: 'Terrace', version: 1 }, { id: id('a', 'bar'), name: 'Bar counter', version: 1 }],
  tills, printers, stations, menu: lanternYardMenu, plans: lanternYardPlans,
  live: { planId: id('plan', 'dinner'), version: liveVersion, since: '2026-11-30T17:00:00.000Z', inForceOn: tills.map((one): TillId => one.id) },
};
