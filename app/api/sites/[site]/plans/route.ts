import { newPlanBody } from '@/features/board/schema';
import { createPlan } from '@/features/board/server/create-plan';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'plan.write', body: newPlanBody }, ({ body, ...actor }) => createPlan(actor, body));
