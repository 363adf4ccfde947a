import { z } from 'zod';
import { ownPath } from '@/lib/http/own-path';
import { problemResponse } from '@/lib/http/problem';
import { asAppError } from '@/lib/server/as-app-error';
import { mustBeSameOrigin, readForm } from '@/lib/server/read-request';

const choice = z.enum(['system', 'light', 'low']);

/** Keeps a person's light in a cookie, so that the first paint is already right. */
export const POST = async (request: Request): Promise<Response> => {
  try {
    mustBeSameOrigin(request);
    const form = await readForm(request);
    const light = choice.catch('system').parse(form.get('light'));
    return new Response(null, { status: 303, headers: { Location: ownPath(form.get('back')), 'Set-Cookie': `light=${light}; Path=/; Max-Age=31536000; SameSite=Lax` } });
  } catch (error) {
    return problemResponse(await asAppError(error));
  }
};
