import { areaInput } from '@/features/tills/schema';
import { createArea } from '@/features/tills/server/write-area';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'till.write', body: areaInput }, ({ body, ...actor }) => createArea(actor, body));
