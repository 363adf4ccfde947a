import { itemInput, itemParams } from '@/features/menu/schema';
import { deleteItem, updateItem } from '@/features/menu/server/items';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'menu.write', params: itemParams, body: itemInput, ifMatch: true }, ({ params, body, version, ...actor }) => updateItem(actor, params.item, version, body));

export const DELETE = route({ permission: 'menu.write', params: itemParams, ifMatch: true }, ({ params, version, ...actor }) => deleteItem(actor, params.item, version));
