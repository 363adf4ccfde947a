import { asId } from '@/lib/domain/site/ids';
import type { Printer } from '@/lib/domain/site/printer';

const networkPrinter = (name: string, lastPart: number, more: Partial<Printer>): Printer => ({
  id: asId(name.toLowerCase().replace(' ', '')), name, model: 'Corrie CT-80', serial: `CT80-26-0${lastPart}`, connection: 'network', hostTill: null,
  address: `10.20.30.${lastPart}`, mask: '255.255.255.0', gateway: '10.20.30.1', port: 9100, mac: `02:54:4D:1E:00:${lastPart.toString(16).toUpperCase()}`, presentAddress: '',
  rollWidthMm: 80, columns: 48, codePage: 'cp858', emphasis: 'inverse', cutter: true, buzzer: true, backup: null, joinsStations: false, sharedPoints: [],
  stage: 'tested', downSince: null, downReason: '', version: 1, ...more,
});

const onKitchenSwitch = [asId<Printer['sharedPoints'][number]>('kitchen-switch')];

/** Seven printers. Meant as mistakes to find: the space in LARDER 1, and PASTRY1, still on the address it was shipped with and never tested. */
export const printers: readonly Printer[] = [
  networkPrinter('GRILL1', 201, { backup: asId('sauce1'), sharedPoints: onKitchenSwitch, stage: 'signed-off' }),
  networkPrinter('LARDER 1', 202, { sharedPoints: onKitchenSwitch, stage: 'reachable' }),
  networkPrinter('SAUCE1', 203, { backup: asId('grill1'), sharedPoints: onKitchenSwitch }),
  networkPrinter('PASTRY1', 204, { backup: asId('pass1'), sharedPoints: [asId('pastry-switch')], presentAddress: '192.168.77.100', stage: 'addressed' }),
  networkPrinter('BAR1', 205, { sharedPoints: [asId('bar-switch')], buzzer: false, stage: 'signed-off' }),
  {
    ...networkPrinter('BAR2', 206, { sharedPoints: [asId('terrace-strip')], buzzer: false, stage: 'signed-off' }),
    model: 'Corrie CT-58', serial: 'CT58-26-0031', connection: 'usb', hostTill: asId('terrace'), address: '', mask: '', gateway: '', mac: '', rollWidthMm: 58, columns: 32,
  },
  networkPrinter('PASS1', 210, { backup: asId('sauce1'), sharedPoints: [asId('pass-switch')], stage: 'reachable' }),
];
