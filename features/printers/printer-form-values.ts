import type { Fix } from '@/lib/domain/findings/finding';
import type { Printer } from '@/lib/domain/site/printer';
import { siteMaskOf } from '@/lib/domain/addresses/device-findings';
import { nextFreeAddress } from '@/lib/domain/addresses/next-free-address';
import type { DraftSite } from '@/lib/domain/checks/check-draft';
import { usualColumns } from '@/lib/domain/devices/printer-words';
import type { PrinterInput } from './schema';

/** What the form starts with: the site's own mask and router, and the next free address. */
export const newPrinterInput = (site: DraftSite): PrinterInput => ({
  name: '', model: '', serial: '', connection: 'network', hostTill: null,
  address: nextFreeAddress(site, 'printer') ?? '', mask: siteMaskOf(site) ?? '', gateway: site.network.gateway, port: 9100, mac: '', presentAddress: '',
  rollWidthMm: 80, columns: usualColumns[80], codePage: 'cp858', emphasis: 'inverse', cutter: true, buzzer: false,
  backup: null, joinsStations: false, sharedPoints: [], stage: 'planned',
});

export const inputOfPrinter = ({ id: _id, version: _version, downSince: _since, downReason: _reason, sharedPoints, ...printer }: Printer): PrinterInput =>
  ({ ...printer, sharedPoints: [...sharedPoints] });

/** What a fix changes in the form; null when it is about something else than this printer's own fields. */
export const fieldsOfFix = (fix: Fix): Partial<PrinterInput> | null => {
  switch (fix.kind) {
    case 'rename-printer': return { name: fix.name };
    case 'set-printer-address': return { address: fix.address };
    case 'set-printer-mask': return { mask: fix.mask };
    case 'set-printer-gateway': return { gateway: fix.gateway };
    case 'set-printer-port': return { port: fix.port };
    case 'set-printer-mac': return { mac: fix.mac };
    default: return null;
  }
};
