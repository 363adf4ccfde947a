import { tillInput, tillParams } from '@/features/tills/schema';
import { deleteTill } from '@/features/tills/server/delete-till';
import { updateTill } from '@/features/tills/server/update-till';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'till.write', params: tillParams, body: tillInput, ifMatch: true },
  ({ params, body, version, ...actor }) => updateTill(actor, { till: params.till, version, input: body }),
);

export const DELETE = route(
  { permission: 'till.write', params: tillParams, ifMatch: true },
  ({ params, version, ...actor }) => deleteTill(actor, { till: params.till, version }),
);
