import { itemsInput, siteParams } from '@/features/menu/schema';
import { createItems } from '@/features/menu/server/items';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'menu.write', params: siteParams, body: itemsInput }, ({ body, ...actor }) => createItems(actor, body.items));
