import { changePlanBody, planParams, renamePlanBody } from '@/features/board/schema';
import { changePlan } from '@/features/board/server/change-plan';
import { deletePlan } from '@/features/board/server/delete-plan';
import { readPlan } from '@/features/board/server/read-plan';
import { renamePlan } from '@/features/board/server/rename-plan';
import { route } from '@/lib/server/route';

export const GET = route({ permission: 'site.read', params: planParams }, ({ params, ...actor }) => readPlan(actor, params.plan));

export const PUT = route({ permission: 'plan.write', params: planParams, body: changePlanBody, ifMatch: true, maxBytes: 4_000_000 },
  ({ params, body, version, ...actor }) => changePlan(actor, { planId: params.plan, version, ...body }));

export const PATCH = route({ permission: 'plan.write', params: planParams, body: renamePlanBody },
  ({ params, body, ...actor }) => renamePlan(actor, params.plan, body));

export const DELETE = route({ permission: 'plan.write', params: planParams, ifMatch: true },
  ({ params, version, ...actor }) => deletePlan(actor, params.plan, version));
