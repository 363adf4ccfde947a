import { problemResponse } from '@/lib/http/problem';
import { asAppError } from '@/lib/server/as-app-error';
import { currentClaims } from '@/lib/server/current-person';
import { mustBeSameOrigin } from '@/lib/server/read-request';
import { endSession } from '@/lib/server/session';
import { noSessionCookie } from '@/lib/server/session-cookie';

/** A plain form posts here: it must work on a tablet whose scripts have not arrived. */
export const POST = async (request: Request): Promise<Response> => {
  try {
    mustBeSameOrigin(request);
    const claims = await currentClaims();
    if (claims !== null) await endSession(claims.sessionId);
    return new Response(null, { status: 303, headers: { Location: '/sign-in?left=1', 'Set-Cookie': noSessionCookie() } });
  } catch (error) {
    return problemResponse(await asAppError(error));
  }
};
