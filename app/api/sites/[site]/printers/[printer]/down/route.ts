import { printerDownInput, printerParams } from '@/features/printers/schema';
import { markPrinter } from '@/features/printers/server/mark-printer';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'printer.mark-down', params: printerParams, body: printerDownInput },
  ({ params, body, ...actor }) => markPrinter(actor, { printer: params.printer, ...body }),
);
