import { itemsInput, pasteInput, siteParams } from '@/features/menu/schema';
import { createItems } from '@/features/menu/server/create-items';
import { pasteItems } from '@/features/menu/server/paste-items';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'menu.write', params: siteParams, body: itemsInput }, ({ body, ...actor }) => createItems(actor, body.items));

export const PUT = route({ permission: 'menu.write', params: siteParams, body: pasteInput }, ({ body, ...actor }) => pasteItems(actor, body));
