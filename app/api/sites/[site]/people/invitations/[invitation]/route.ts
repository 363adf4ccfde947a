import { invitationParams } from '@/features/people/schema';
import { inviteAgain, takeInvitationBack } from '@/features/people/server/invite';
import { route } from '@/lib/server/route';

/** The same invitation, sent once more. */
export const POST = route({ permission: 'people.write', params: invitationParams }, ({ params, ...actor }) => inviteAgain(actor, params.invitation, new Date()));

export const DELETE = route({ permission: 'people.write', params: invitationParams }, ({ params, ...actor }) => takeInvitationBack(actor, params.invitation));
