import { siteMaskOf } from '@/lib/domain/addresses/device-findings';
import { nextFreeAddress } from '@/lib/domain/addresses/next-free-address';
import type { DraftSite } from '@/lib/domain/checks/check-draft';
import { directPort } from '@/lib/domain/checks/queue-findings';
import type { Fix } from '@/lib/domain/findings/finding';
import { asId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Printer } from '@/lib/domain/site/printer';
import type { TillInput } from './schema';

export type QueueDraft = TillInput['queues'][number];

/** What the form starts with: the site's mask and the next free address for a till. */
export const newTillInput = (site: DraftSite, area: string): TillInput => ({
  name: '', kind: 'fixed', area, orderTypes: [...orderTypes], system: 'windows',
  address: nextFreeAddress(site, 'till') ?? '', mask: siteMaskOf(site) ?? '', addressSource: 'static', adapter: '',
  sharedPoints: [], defaultPrinter: null, printsThrough: null, queues: [],
});

/** A printer as it should be installed on a till. */
export const queueFor = (printer: Printer, tillId: string): QueueDraft => ({
  printer: printer.id, typedName: printer.name, ...(directPort(printer, { id: asId(tillId) }) ?? { portKind: 'tcp', portAddress: '' }), testPrintedAt: null,
});

const inQueue = (values: TillInput, printer: string, change: Partial<QueueDraft>): Partial<TillInput> => ({
  queues: values.queues.map((queue) => (queue.printer === printer ? { ...queue, ...change } : queue)),
});

/** What a fix changes in the form; null when it is about something else than this till's own fields. */
export const fieldsOfFix = (fix: Fix, values: TillInput): Partial<TillInput> | null => {
  switch (fix.kind) {
    case 'set-till-address': return { address: fix.address };
    case 'set-till-mask': return { mask: fix.mask };
    case 'clear-prints-through': return { printsThrough: null };
    case 'clear-default-printer': return { defaultPrinter: null };
    case 'rename-queue': return inQueue(values, fix.printer, { typedName: fix.name });
    case 'set-queue-port': return inQueue(values, fix.printer, { portKind: fix.portKind, portAddress: fix.portAddress });
    default: return null;
  }
};
