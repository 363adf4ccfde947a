import { planParams } from '@/features/board/schema';
import { readSite } from '@/features/board/server/read-site';
import { route } from '@/lib/server/route';

/** The whole site, for the proof that runs beside the board. */
export const GET = route({ permission: 'site.read', params: planParams }, (actor) => readSite(actor));
