import { asId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import type { Till } from '@/lib/domain/site/till';

const printer = (name: string, lastPart: number, more: Partial<Printer>): Printer => ({
  id: asId(name.toLowerCase()), name, model: 'Corrie CT-80', serial: `CT80-25-7${lastPart}`, connection: 'network', hostTill: null, address: `192.168.40.${lastPart}`, mask: '255.255.255.0',
  gateway: '192.168.40.1', port: 9100, mac: `02:54:4D:28:00:${lastPart}`, presentAddress: '', rollWidthMm: 80, columns: 48, codePage: 'cp858', emphasis: 'inverse', cutter: true, buzzer: false,
  backup: null, joinsStations: false, sharedPoints: [asId('shop-switch')], stage: 'planned', downSince: null, downReason: '', version: 1, ...more,
});

/**
 * The oven and the bench stand side by side and share a printer, which puts both on one ticket. Meant as mistakes to find:
 * OVEN1 gave itself an address because nobody else did, and COFFEE1 stands where the router may give its address away.
 */
const printers: readonly Printer[] = [
  printer('OVEN1', 21, { joinsStations: true, address: '169.254.20.7', mask: '255.255.0.0', gateway: '', stage: 'planned' }),
  printer('COFFEE1', 22, { model: 'Corrie CT-58', rollWidthMm: 58, columns: 32, address: '192.168.40.120', stage: 'reachable' }),
];

const station = (row: Pick<Station, 'name' | 'code' | 'mesh' | 'colour' | 'position'>, printerId: string, standIn: Station['standIn']): Station => ({
  ...row, id: asId(row.name.toLowerCase()), kind: 'prep', printers: [asId(printerId)], open: true, standIn, layout: 'by-course', ticketsPerSending: 1, pace: null, version: 1,
});

const stations: readonly Station[] = [
  station({ name: 'Oven', code: 'OV', mesh: 'grain', colour: 'rust', position: 0 }, 'oven1', asId('bench')),
  station({ name: 'Bench', code: 'BN', mesh: 'chevron', colour: 'harbour', position: 1 }, 'oven1', null),
  station({ name: 'Coffee', code: 'CF', mesh: 'rings', colour: 'iron', position: 2 }, 'coffee1', null),
];

const tills: readonly Till[] = [
  {
    id: asId('shop-counter'), name: 'Shop counter', kind: 'fixed', area: asId('shop'), orderTypes: [...orderTypes], system: 'linux', address: '192.168.40.11', mask: '255.255.255.0',
    addressSource: 'static', adapter: 'enp1s0', sharedPoints: [asId('shop-switch')], defaultPrinter: null, printsThrough: null, version: 1,
    queues: printers.map(({ id, name, address, port }) => ({ printer: id, typedName: name, portKind: 'tcp' as const, portAddress: `${address}:${port}`, testPrintedAt: null }))
      .toSorted((left, right) => (left.printer < right.printer ? -1 : 1)),
  },
  {
    id: asId('garden-handheld'), name: 'Garden handheld', kind: 'handheld', area: asId('garden'), orderTypes: ['eat-in'], system: 'other', address: '192.168.40.60', mask: '255.255.255.0',
    addressSource: 'dhcp-reserved', adapter: '', sharedPoints: [asId('garden-access-point')], defaultPrinter: null, printsThrough: asId('shop-counter'), queues: [], version: 1,
  },
];

export const devices: Pick<Site, 'printers' | 'stations' | 'tills'> = { printers, stations, tills };
