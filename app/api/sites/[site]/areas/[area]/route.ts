import { areaInput, areaParams } from '@/features/tills/schema';
import { deleteArea, renameArea } from '@/features/tills/server/write-area';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'till.write', params: areaParams, body: areaInput, ifMatch: true },
  ({ params, body, version, ...actor }) => renameArea(actor, { area: params.area, version, input: body }),
);

export const DELETE = route(
  { permission: 'till.write', params: areaParams, ifMatch: true },
  ({ params, version, ...actor }) => deleteArea(actor, { area: params.area, version }),
);
