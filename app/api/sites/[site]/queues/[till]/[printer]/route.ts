import { queueInput, queueParams } from '@/features/tills/schema';
import { removeQueue, writeQueue } from '@/features/tills/server/write-queue';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'till.write', params: queueParams, body: queueInput },
  ({ params, body, ...actor }) => writeQueue(actor, { till: params.till, printer: params.printer, input: body }),
);

export const DELETE = route(
  { permission: 'till.write', params: queueParams },
  ({ params, ...actor }) => removeQueue(actor, { till: params.till, printer: params.printer }),
);
