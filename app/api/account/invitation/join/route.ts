import { joinInput } from '@/features/people/schema';
import { joinAs } from '@/features/people/server/join';
import { route } from '@/lib/server/route';

export const POST = route({ permission: 'signed-in', body: joinInput }, ({ person, body }) => joinAs(person, body.token, new Date()));
