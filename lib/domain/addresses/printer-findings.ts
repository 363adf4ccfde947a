import type { Finding, Fix } from '../findings/finding';
import type { Printer } from '../site/printer';
import { judgeDeviceAddress, siteMaskOf, type Device, type JudgeOptions } from './device-findings';
import { parseMac } from './mac';
import { maskFinding } from './mask-findings';
import { nextFreeAddress } from './next-free-address';
import type { AddressSite } from './taken-addresses';

/** The port of plain ticket bytes, IANA "pdl-datastream". */
export const rawPort = 9100;

const deviceOf = (site: AddressSite, printer: Printer, { promised = [], yields = false }: JudgeOptions): Device => ({
  yields,
  kind: 'printer', id: printer.id, name: printer.name || 'This printer', address: printer.address, mask: printer.mask, keepsItsAddress: true,
  subject: { kind: 'printer', id: printer.id },
  free: nextFreeAddress(site, 'printer', promised),
  offer: (address): readonly Fix[] => (address === null ? [] : [{ kind: 'set-printer-address', printer: printer.id, address, label: `Give it ${address}` }]),
});

const gatewayFinding = (site: AddressSite, printer: Printer, name: string): readonly Finding[] => {
  const { gateway } = site.network;
  if (printer.gateway === '' || gateway === '' || printer.gateway === gateway) return [];
  return [{
    code: 'gateway-differs', severity: 'check', subject: { kind: 'printer', id: printer.id, field: 'gateway' },
    title: `${name} has another gateway than the site`,
    message: `Tickets from the site's own tills do not pass it. Anything from outside does. The site's is ${gateway}.`,
    fixes: [{ kind: 'set-printer-gateway', printer: printer.id, gateway, label: `Use ${gateway}` }],
  }];
};

const portFinding = (printer: Printer, name: string): readonly Finding[] => {
  if (printer.port === rawPort) return [];
  return [{
    code: 'port-unusual', severity: 'check', subject: { kind: 'printer', id: printer.id, field: 'port' },
    title: `${name} listens on port ${printer.port}`,
    message: `Nearly all ticket printers take their tickets on port ${rawPort}, and ordering software expects that.`,
    fixes: [{ kind: 'set-printer-port', printer: printer.id, port: rawPort, label: `Use port ${rawPort}` }],
  }];
};

const macFinding = (site: AddressSite, printer: Printer, name: string): readonly Finding[] => {
  if (printer.mac === '') return [];
  const subject = { kind: 'printer', id: printer.id, field: 'mac' } as const;
  const clear: Fix = { kind: 'set-printer-mac', printer: printer.id, mac: '', label: 'Clear it until it has been read again' };
  const parsed = parseMac(printer.mac);
  if (!parsed.ok) {
    return [{ code: 'mac-form', severity: 'check', subject, title: `${name} has ${printer.mac.trim()}, which is not a MAC address`, message: parsed.reason, fixes: [clear] }];
  }
  const same = (other: Printer): boolean => {
    const read = parseMac(other.mac);
    return read.ok && read.value === parsed.value;
  };
  const other = site.printers.find((one) => one.id !== printer.id && same(one));
  if (other === undefined) return [];
  return [{
    code: 'mac-twice', severity: 'check', subject,
    title: `${name} and ${other.name} have the same MAC address`,
    message: 'No two devices have the same one, so one of them was read or typed wrongly. A reservation in the router would go to the wrong printer.',
    fixes: [clear],
  }];
};

/** All that is wrong with where one printer is. */
export const printerAddressFindings = (site: AddressSite, printer: Printer, options: JudgeOptions = {}): readonly Finding[] => {
  const name = printer.name || 'This printer';
  const mac = macFinding(site, printer, name);
  if (printer.connection !== 'network') return mac;
  return [
    ...judgeDeviceAddress(site, deviceOf(site, printer, options)),
    ...maskFinding({
      name, mask: printer.mask, subject: { kind: 'printer', id: printer.id },
      offer: (mask) => ({ kind: 'set-printer-mask', printer: printer.id, mask, label: `Use ${mask}` }),
    }, siteMaskOf(site)),
    ...gatewayFinding(site, printer, name),
    ...portFinding(printer, name),
    ...mac,
  ];
};
