import { invitationInput } from '@/features/people/schema';
import { invite } from '@/features/people/server/invite';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'people.write', body: invitationInput }, ({ body, ...actor }) => invite(actor, body, new Date()));
