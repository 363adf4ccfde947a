import { tillInput } from '@/features/tills/schema';
import { createTill } from '@/features/tills/server/create-till';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'till.write', body: tillInput }, ({ body, ...actor }) => createTill(actor, body));
