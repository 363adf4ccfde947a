import { asId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import { anyCondition, type Rule } from '@/lib/domain/site/plan';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import type { Till } from '@/lib/domain/site/till';
import { readMenu } from '../read-menu';

const id = <Id extends string>(kind: string, name: string): Id => asId<Id>(`po-${kind}-${name}`);

const menu = readMenu('po', [
  { section: 'Breads', course: 'Food', seconds: 60, lines: ['Country loaf | COUNTRY | gluten', 'Rye loaf | RYE | gluten', 'Seeded roll | SEED ROLL | gluten, sesame', 'Baguette | BAGUETTE | gluten', 'Milk bread | MILK BREAD | gluten, milk', 'Focaccia | FOCACCIA | gluten'] },
  { section: 'Toasts and plates', course: 'Food', seconds: 300, lines: ['Egg on toast | EGG TOAST | gluten, eggs | Toast', 'Mushrooms on toast | MUSH TOAST | gluten | Toast', 'Ham and cheese | HAM CHEESE | gluten, milk | Toast', 'Porridge | PORRIDGE | gluten, milk', 'Soup, bread | SOUP | celery, gluten', 'Jam and butter | JAM BUTTER | gluten, milk'] },
  { section: 'Cakes', course: 'Food', seconds: 60, lines: ['Cinnamon bun | CIN BUN | gluten, milk, eggs', 'Carrot cake | CARROT CAKE | gluten, eggs, nuts', 'Brownie | BROWNIE | eggs, milk', 'Lemon slice | LEMON SLICE | gluten, eggs', 'Éclair | ECLAIR | gluten, eggs, milk'] },
  { section: 'Coffee and tea', course: 'Drinks', seconds: 90, lines: ['Espresso | ESPRESSO', 'Long coffee | LONG', 'Flat white | FLAT WHITE | milk', 'Filter | FILTER', 'Pot of tea | POT TEA', 'Hot chocolate | HOT CHOC | milk', 'Apple juice | APPLE JUICE'] },
], [{ group: 'Toast', min: 0, max: 1, lines: ['Rye toast | RYE TOAST | gluten', 'White toast | WHITE TOAST | gluten'] }]);

const printer = (name: string, key: string, more: Partial<Printer>): Printer => ({
  id: id('p', key), name, model: 'Thermal, 80 mm', serial: `PO-${key}`, connection: 'network', hostTill: null, address: '', mask: '255.255.255.0', gateway: '192.168.44.1', port: 9100, mac: '',
  presentAddress: '', rollWidthMm: 80, columns: 42, codePage: 'cp858', emphasis: 'frame', cutter: true, buzzer: false, backup: null, joinsStations: false, sharedPoints: [], stage: 'planned',
  downSince: null, downReason: '', version: 1, ...more,
});

/** OVEN1 chose its own address because nobody gave it one; COUNTER1 stands where the router may give its address away. */
const printers = [printer('OVEN1', 'oven1', { address: '169.254.20.7', mask: '255.255.0.0', gateway: '' }), printer('COUNTER1', 'counter1', { address: '192.168.44.120', stage: 'reachable', backup: id('p', 'oven1') })];

const station = (name: string, code: string, key: string, position: number, own: string, more: Partial<Station>): Station => ({
  id: id('st', key), name, code, kind: 'prep', mesh: 'square', colour: 'rust', position, printers: [id('p', own)], open: true, standIn: null, layout: 'by-course', ticketsPerSending: 1, pace: null, version: 1, ...more,
});

const till = (name: string, key: string, last: number, more: Partial<Till> = {}): Till => ({
  id: id('t', key), name, kind: 'fixed', area: id('a', 'shop'), orderTypes: orderTypes.filter((type) => type !== 'delivery'), system: 'linux', address: `192.168.44.${last}`, mask: '255.255.255.0', addressSource: 'static',
  adapter: 'enp2s0', sharedPoints: [], defaultPrinter: null, printsThrough: null, version: 1,
  queues: printers.map((one) => ({ printer: one.id, typedName: one.name, portKind: 'tcp' as const, portAddress: `socket://${one.address}:9100`, testPrintedAt: null })), ...more,
});

const send = (plan: string, section: string, to: string): Rule =>
  ({ id: asId(`po-r-${plan}-${section}`), kind: 'send', target: { kind: 'section', section: id('s', section) }, conditions: anyCondition, stations: [id('st', to)], keep: false });

/** A small bakery that is still being set up: its mistakes are in its addresses. */
export const pilgrimsOven: Site = {
  id: asId('pilgrims-oven'), name: 'Pilgrim’s Oven', place: 'Haverlow', timeZone: 'Europe/Dublin', language: 'en', version: 1,
  network: { subnet: '192.168.44.0/24', gateway: '192.168.44.1', poolFrom: '192.168.44.100', poolTo: '192.168.44.199', reserved: [] },
  namingPolicy: { minLength: 2, maxLength: 12, allowUnderscore: true, allowHyphen: true, mustStartWithLetter: true },
  follows: 'by-hand', link: { kind: 'none' }, contacts: [{ kind: 'installer', name: 'Femi Lindqvist', phone: '+00 0000 000101', email: 'femi@lindqvist-onsite.example' }],
  courses: [{ id: id('c', 'drinks'), name: 'Drinks' }, { id: id('c', 'food'), name: 'Food' }], sharedPoints: [],
  areas: [{ id: id('a', 'shop'), name: 'Shop', version: 1 }],
  tills: [till('Front till', 'front', 21), till('Window', 'window', 22)],
  printers,
  stations: [station('Kitchen', 'KT', 'kitchen', 0, 'oven1', { mesh: 'chevron', colour: 'rust' }), station('Counter', 'CN', 'counter', 1, 'counter1', { mesh: 'rings', colour: 'harbour' })],
  menu,
  plans: [
    { id: id('plan', 'day'), name: 'Day', position: 0, version: 2, offers: null, weeklyTimes: [1, 2, 3, 4, 5, 6].map((weekday) => ({ weekday, start: '07:30' })), rules: [send('day', 'breads', 'counter'), send('day', 'toasts-and-plates', 'kitchen'), send('day', 'cakes', 'counter'), send('day', 'coffee-and-tea', 'counter')] },
    { id: id('plan', 'sunday'), name: 'Sunday', position: 1, version: 1, offers: [id('s', 'breads'), id('s', 'cakes'), id('s', 'coffee-and-tea')], weeklyTimes: [{ weekday: 7, start: '08:30' }], rules: [send('sunday', 'breads', 'counter'), send('sunday', 'cakes', 'counter'), send('sunday', 'coffee-and-tea', 'counter')] },
  ],
  live: { planId: id('plan', 'day'), version: 2, since: '2026-11-30T07:30:00.000Z', inForceOn: [id('t', 'front')] },
};
