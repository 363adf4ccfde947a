import { fixBody } from '@/features/fixes/schema';
import { applyFix } from '@/features/fixes/server/apply-fix';
import { route } from '@/lib/server/route';

/** Which right it takes depends on the fix, and the use case asks for exactly that one. */
export const POST = route({ permission: 'site.read', body: fixBody }, ({ body, ...actor }) => applyFix(actor, body.fix));
