import { tryOrderInput } from '@/features/try-order/schema';
import { tryOrderOnServer } from '@/features/try-order/server/try-order-on-server';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'order.try', body: tryOrderInput }, ({ person, membership, siteId, body }) =>
  tryOrderOnServer({ person, membership, siteId, ...body }));
