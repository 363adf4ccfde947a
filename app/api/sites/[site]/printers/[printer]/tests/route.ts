import { printedTestInput, printerParams } from '@/features/printers/schema';
import { recordTest } from '@/features/printers/server/record-test';
import { route } from '@/lib/server/route';

export const POST = route(
  { permission: 'printer.test', params: printerParams, body: printedTestInput },
  ({ params, body, ...actor }) => recordTest(actor, { printer: params.printer, ...body }),
);
