import { backupInput, printerParams } from '@/features/printers/schema';
import { setBackup } from '@/features/printers/server/set-backup';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'printer.set-backup', params: printerParams, body: backupInput },
  ({ params, body, ...actor }) => setBackup(actor, { printer: params.printer, backup: body.backup }),
);
