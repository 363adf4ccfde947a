import { asId } from '@/lib/domain/site/ids';
import type { Printer } from '@/lib/domain/site/printer';
import type { PrinterInput } from './schema';

/** The id a printer goes by until the server has given it one. */
export const newPrinterId = 'new';

/** The printer as it would be if this were saved; a printer on the network hangs on no till. */
export const printerOfInput = (input: PrinterInput, id: string, before: Printer | null): Printer => ({
  ...input,
  id: asId(id),
  hostTill: input.connection === 'network' || input.hostTill === null ? null : asId(input.hostTill),
  backup: input.backup === null ? null : asId(input.backup),
  sharedPoints: input.sharedPoints.map((point) => asId(point)),
  port: Number.isFinite(input.port) ? input.port : 0,
  columns: Number.isFinite(input.columns) ? input.columns : 0,
  downSince: before?.downSince ?? null,
  downReason: before?.downReason ?? '',
  version: before?.version ?? 1,
});
