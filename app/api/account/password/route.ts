import { changePasswordInput } from '@/features/account/schema';
import { changePassword } from '@/features/account/server/change-password';
import { addressOf } from '@/lib/server/address-of';
import { route } from '@/lib/server/route';
import { sessionCookie } from '@/lib/server/session-cookie';

export const POST = route({ permission: 'signed-in', body: changePasswordInput }, async ({ person, body, request }) => {
  const claims = await changePassword(person, body, addressOf(request.headers.get('x-forwarded-for')));
  return Response.json({}, { headers: { 'Cache-Control': 'no-store', 'Set-Cookie': await sessionCookie(claims) } });
});
