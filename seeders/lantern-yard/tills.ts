import { asId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Printer } from '@/lib/domain/site/printer';
import type { Queue, Till } from '@/lib/domain/site/till';
import { printers } from './printers';

type TillRow = { readonly name: string; readonly area: string; readonly lastPart: number; readonly sharedPoint: string };

const rows: readonly TillRow[] = [
  { name: 'Till 1', area: 'main-room', lastPart: 61, sharedPoint: 'main-room-switch' },
  { name: 'Till 2', area: 'main-room', lastPart: 62, sharedPoint: 'main-room-switch' },
  { name: 'Till 3', area: 'main-room', lastPart: 63, sharedPoint: 'main-room-switch' },
  { name: 'Terrace', area: 'terrace', lastPart: 64, sharedPoint: 'terrace-strip' },
  { name: 'Counter', area: 'bar-counter', lastPart: 65, sharedPoint: 'bar-switch' },
];

/** Pairs that no test has come out of yet, beside all of PASTRY1's. */
const untested = new Set(['Till 2 LARDER 1', 'Till 3 PASS1']);

const queueOn = (till: string, printer: Printer, testedAt: string): Queue => ({
  printer: printer.id, typedName: printer.name,
  ...(printer.connection === 'usb' ? { portKind: 'usb', portAddress: 'USB001' } : { portKind: 'tcp', portAddress: `${printer.address}:${printer.port}` }),
  // Meant as a mistake to find: the driver's installer picked a parallel port by itself.
  ...(till === 'Till 3' && printer.name === 'PASS1' ? { portKind: 'parallel', portAddress: 'LPT1:' } : {}),
  testPrintedAt: printer.name === 'PASTRY1' || untested.has(`${till} ${printer.name}`) ? null : testedAt,
});

/** Five tills, each with a queue for every printer it can reach: 31 pairs, of which 24 have printed a test. */
export const tillsTestedAt = (testedAt: string): readonly Till[] => rows.map(({ name, area, lastPart, sharedPoint }) => {
  const id = asId<Till['id']>(name.toLowerCase().replace(' ', '-'));
  return {
    id, name, kind: 'fixed', area: asId(area), orderTypes: [...orderTypes], system: 'windows', address: `10.20.30.${lastPart}`, mask: '255.255.255.0', addressSource: 'static',
    adapter: 'Ethernet', sharedPoints: [asId(sharedPoint)], defaultPrinter: null, printsThrough: null, version: 1,
    queues: printers.filter((printer) => printer.connection === 'network' || printer.hostTill === id).map((printer) => queueOn(name, printer, testedAt))
      .toSorted((left, right) => (left.printer < right.printer ? -1 : 1)),
  };
});
