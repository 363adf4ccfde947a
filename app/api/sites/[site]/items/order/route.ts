import { orderInput, siteParams } from '@/features/menu/schema';
import { orderItems } from '@/features/menu/server/order-items';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'menu.write', params: siteParams, body: orderInput }, ({ body, ...actor }) => orderItems(actor, body.ids));
