import { orderInput, siteParams } from '@/features/menu/schema';
import { orderSections } from '@/features/menu/server/order-sections';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'menu.write', params: siteParams, body: orderInput }, ({ body, ...actor }) => orderSections(actor, body.ids));
