import { memberInput, memberParams } from '@/features/people/schema';
import { changeMember, removeMember } from '@/features/people/server/change-member';
import { route } from '@/lib/server/route';

export const PUT = route(
  { permission: 'people.write', params: memberParams, body: memberInput, ifMatch: true },
  ({ params, body, version, ...actor }) => changeMember(actor, { person: params.person, version }, body),
);

export const DELETE = route(
  { permission: 'people.write', params: memberParams, ifMatch: true },
  ({ params, version, ...actor }) => removeMember(actor, { person: params.person, version }),
);
