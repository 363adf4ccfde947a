import { acceptInput } from '@/features/people/schema';
import { joinAsNewPerson } from '@/features/people/server/join';
import { route } from '@/lib/server/route';
import { sessionCookie } from '@/lib/server/session-cookie';

/** Anybody who holds the token of an invitation. */
export const POST = route({ permission: 'public', body: acceptInput }, async ({ body }) => {
  const { claims, ...joined } = await joinAsNewPerson(body, new Date());
  return Response.json(joined, { headers: { 'Cache-Control': 'no-store', 'Set-Cookie': await sessionCookie(claims) } });
});
