import { z } from 'zod';
import { mustBeSameOrigin } from '@/lib/server/read-request';
import { asAppError } from '@/lib/server/as-app-error';
import { problemResponse } from '@/lib/http/problem';

const choice = z.enum(['system', 'light', 'low']);

/** Keeps a person's light in a cookie, so that the first paint is already right. */
export const POST = async (request: Request): Promise<Response> => {
  try {
    mustBeSameOrigin(request);
    const form = await request.formData();
    const light = choice.catch('system').parse(form.get('light'));
    const back = String(form.get('back') ?? '/');
    const target = back.startsWith('/') && !back.startsWith('//') && !back.includes('\\') ? back : '/';
    return new Response(null, { status: 303, headers: { Location: target, 'Set-Cookie': `light=${light}; Path=/; Max-Age=31536000; SameSite=Lax` } });
  } catch (error) {
    return problemResponse(await asAppError(error));
  }
};
