import { asId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import type { DemoSite } from '../demo-site';
import { send, sendItem, splitOption, versionsOf } from '../plan-history';
import { devices } from './devices';
import { menu } from './menu';

const surroundings: Pick<Site, 'network' | 'contacts' | 'courses' | 'sharedPoints' | 'areas'> = {
  network: { subnet: '192.168.40.0/24', gateway: '192.168.40.1', poolFrom: '192.168.40.50', poolTo: '192.168.40.199', reserved: [{ address: '192.168.40.60', reason: 'Garden handheld' }] },
  contacts: [{ kind: 'installer', name: 'Femi Lindqvist', phone: '+44 1632 960143', email: 'femi@lindqvist.example' }],
  courses: [{ id: asId('drinks'), name: 'Drinks' }, { id: asId('food'), name: 'Food' }],
  sharedPoints: [{ id: asId('shop-switch'), name: 'Shop switch', kind: 'switch' }, { id: asId('garden-access-point'), name: 'Garden access point', kind: 'access-point' }],
  areas: [{ id: asId('shop'), name: 'Shop', version: 1 }, { id: asId('garden'), name: 'Garden', version: 1 }],
};

const board = { menu, areas: surroundings.areas, ...devices };
const everyDayEdits = [
  send(['Bread', 'Pastries', 'Hot from the oven'], 'Oven'), send(['Sandwiches and soup'], 'Bench'), send(['Coffee and cold drinks'], 'Coffee'), splitOption('bread-warmed-through', 'Oven'),
];
const marketEdits = [send(['Bread', 'Pastries'], 'Bench'), send(['Hot from the oven'], 'Oven'), send(['Coffee and cold drinks'], 'Coffee'), sendItem('Cheese scone', 'Oven')];
const weekdays = [1, 2, 3, 4, 5];

/** A bakery with a few tables, not open yet: its plans are made, nothing is live, and no printer has printed. */
export const pilgrimsOven: DemoSite = {
  plans: [
    { name: 'Every day', weeklyTimes: [...weekdays, 7].map((weekday) => ({ weekday, start: '06:30' })), versions: versionsOf(board, 'Every day', null, everyDayEdits) },
    {
      name: 'Market day', weeklyTimes: [{ weekday: 6, start: '06:00' }],
      versions: versionsOf(board, 'Market day', ['Bread', 'Pastries', 'Hot from the oven', 'Coffee and cold drinks', 'Gifts'], marketEdits),
    },
  ],
  live: null,
  siteTestedAt: () => ({
    id: asId('pilgrims-oven'), name: "Pilgrim's Oven", place: 'Haverlow', timeZone: 'Europe/London', language: 'en-GB',
    namingPolicy: { minLength: 2, maxLength: 12, allowUnderscore: true, allowHyphen: true, mustStartWithLetter: true },
    follows: 'by-hand', link: { kind: 'none' }, version: 1, menu, ...surroundings, ...devices,
  }),
};
