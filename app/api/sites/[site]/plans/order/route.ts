import { orderPlansBody } from '@/features/board/schema';
import { orderPlans } from '@/features/board/server/order-plans';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'plan.write', body: orderPlansBody }, ({ body, ...actor }) => orderPlans(actor, body.plans));
