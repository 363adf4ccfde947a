import { printerInput, printerParams } from '@/features/printers/schema';
import { deletePrinter } from '@/features/printers/server/delete-printer';
import { updatePrinter } from '@/features/printers/server/update-printer';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'printer.write', params: printerParams, body: printerInput, ifMatch: true },
  ({ params, body, version, ...actor }) => updatePrinter(actor, { printer: params.printer, version, input: body }),
);

export const DELETE = route(
  { permission: 'printer.write', params: printerParams, ifMatch: true },
  ({ params, version, ...actor }) => deletePrinter(actor, { printer: params.printer, version }),
);
