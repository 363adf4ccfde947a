import { planParams } from '@/features/board/schema';
import { ping } from '@/features/board/server/presence';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'site.read', params: planParams }, ({ params, ...actor }) => ping(actor, params.plan, Date.now()));
