import type { Printer, PrinterStage } from '../site/printer';
import type { Queue } from '../site/till';

/** What a printed test proved: that bytes sent this way come out of this very device. */
const provenBy = ['connection', 'hostTill', 'address', 'mask', 'port', 'mac', 'serial'] as const satisfies readonly (keyof Printer)[];
type Proven = Pick<Printer, (typeof provenBy)[number]>;

/** A first MAC or serial written down is no new device; a different one is. */
const learnt = (field: keyof Proven, before: Proven): boolean => (field === 'mac' || field === 'serial') && before[field] === '';

/** Whether tests printed before a change still say anything about the printer after it. */
export const printerTestsStand = (before: Proven, after: Proven): boolean =>
  provenBy.every((field) => before[field] === after[field] || learnt(field, before));

/** Whether the test of one queue still says anything: its port is the way the test took, its name is not. */
export const queueTestStands = (before: Pick<Queue, 'portKind' | 'portAddress'>, after: Pick<Queue, 'portKind' | 'portAddress'>): boolean =>
  before.portKind === after.portKind && before.portAddress === after.portAddress;

/** Where a printer stands once its tests no longer do: it has to be reached and tested again. */
export const stageWithoutTests = (stage: PrinterStage): PrinterStage => (stage === 'planned' ? 'planned' : 'addressed');
