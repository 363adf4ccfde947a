import { cookies } from 'next/headers';
import { currentClaims } from '@/lib/server/current-person';
import { mustBeSameOrigin } from '@/lib/server/read-request';
import { asAppError } from '@/lib/server/as-app-error';
import { problemResponse } from '@/lib/http/problem';
import { endSession } from '@/lib/server/session';

/** A plain form posts here: it must work on a tablet whose scripts have not arrived. */
export const POST = async (request: Request): Promise<Response> => {
  try {
    mustBeSameOrigin(request);
    const claims = await currentClaims();
    if (claims !== null) await endSession(claims.sessionId);
    const jar = await cookies();
    for (const { name } of jar.getAll()) if (name.includes('next-auth.session-token')) jar.delete(name);
    return new Response(null, { status: 303, headers: { Location: '/sign-in?left=1' } });
  } catch (error) {
    return problemResponse(await asAppError(error));
  }
};
