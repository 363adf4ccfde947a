import { planParams, weeklyTimesBody } from '@/features/board/schema';
import { setWeeklyTimes } from '@/features/board/server/set-weekly-times';
import { route } from '@/lib/server/route';

export const PUT = route({ permission: 'plan.write', params: planParams, body: weeklyTimesBody },
  ({ params, body, ...actor }) => setWeeklyTimes(actor, params.plan, body));
