import { itemInput, itemParams } from '@/features/menu/schema';
import { deleteItem } from '@/features/menu/server/delete-item';
import { readItem } from '@/features/menu/server/read-item';
import { updateItem } from '@/features/menu/server/update-item';
import { route } from '@/lib/server/route';

export const GET = route({ permission: 'site.read', params: itemParams }, ({ params, ...actor }) => readItem(actor, params.item));

export const PUT = route(
  { permission: 'menu.write', params: itemParams, body: itemInput, ifMatch: true },
  ({ params, body, version, ...actor }) => updateItem(actor, { item: params.item, version, input: body }),
);

export const DELETE = route(
  { permission: 'menu.write', params: itemParams, ifMatch: true },
  ({ params, version, ...actor }) => deleteItem(actor, { item: params.item, version }),
);
