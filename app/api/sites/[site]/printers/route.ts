import { createPrinter } from '@/features/printers/server/create-printer';
import { printerInput } from '@/features/printers/schema';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'printer.write', body: printerInput }, ({ body, ...actor }) => createPrinter(actor, body));
