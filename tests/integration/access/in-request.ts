import 'next/dist/server/node-environment-baseline';
import { createRequestStoreForAPI } from 'next/dist/server/async-storage/request-store';
import { workAsyncStorage } from 'next/dist/server/app-render/work-async-storage.external';
import { workUnitAsyncStorage } from 'next/dist/server/app-render/work-unit-async-storage.external';
import { NextRequest } from 'next/server';
import { sessionCookie } from '@/lib/server/session-cookie';
import { startSession } from '@/lib/server/session';
import { PersonRow } from '@/models/person';

export const origin = 'http://127.0.0.1:3000';

export type Handler = (request: NextRequest, context: { readonly params: Promise<Record<string, string | string[]> | undefined> }) => Promise<Response>;

export type Call = {
  readonly method: string;
  readonly path?: string;
  readonly params?: Readonly<Record<string, string | string[]>>;
  /** Sent as JSON unless it is a string, a form or a stream. */
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string | undefined>>;
  /** "name=value" of a session, from `cookieOf`. */
  readonly cookie?: string;
};

const bodyOf = (body: unknown): BodyInit | undefined => {
  if (body === undefined || typeof body === 'string' || body instanceof URLSearchParams || body instanceof ReadableStream) return body as BodyInit | undefined;
  return JSON.stringify(body);
};

const ownHeaders = (method: string): Readonly<Record<string, string>> =>
  ({ host: '127.0.0.1:3000', ...(method === 'GET' ? {} : { 'origin': origin, 'sec-fetch-site': 'same-origin', 'content-type': 'application/json' }) });

/** Calls a route handler as the framework does: the request's cookies are what `cookies()` gives. */
export const call = (handler: unknown, { method, path = '/', params, body, headers = {}, cookie }: Call): Promise<Response> => {
  const sent = new Headers(ownHeaders(method));
  for (const [name, value] of Object.entries(headers)) {
    if (value === undefined) sent.delete(name);
    else sent.set(name, value);
  }
  if (cookie !== undefined) sent.set('cookie', cookie);
  const hasBody = method !== 'GET' && method !== 'HEAD';
  const request = new NextRequest(`${origin}${path}`, { method, headers: sent, ...(hasBody ? { body: bodyOf(body ?? {}) ?? null, duplex: 'half' } : {}) });
  const store = createRequestStoreForAPI(request as never, request.nextUrl, undefined as never, undefined, undefined, undefined);
  const work = { route: path, page: path } as never;
  return workAsyncStorage.run(work, () => workUnitAsyncStorage.run(store, () => (handler as Handler)(request, { params: Promise.resolve(params) })));
};

/** Signs a person of the demo in, without the form. */
export const cookieOf = async (personId: string): Promise<string> => {
  const person = await PersonRow.findByPk(personId);
  if (person === null) throw new Error(`The demo has no ${personId}.`);
  return cookieIn(await sessionCookie(await startSession(person)));
};

/** The "name=value" of a Set-Cookie. */
export const cookieIn = (setCookie: string): string => setCookie.split(';')[0] ?? '';
