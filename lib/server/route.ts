import 'server-only';
import type { z } from 'zod';
import type { Permission } from '@/lib/domain/roles/permissions';
import { AppError } from '@/lib/http/errors';
import { problemResponse } from '@/lib/http/problem';
import { mustBeAllowed, type Actor, type Person } from './actor';
import { asAppError } from './as-app-error';
import { currentPerson, membershipOn } from './current-person';
import { mustBeSameOrigin, readBody, readVersion } from './read-request';

type Schema = z.ZodType;
type Parsed<Of> = Of extends Schema ? z.output<Of> : undefined;

/** Who may call: anybody, anybody signed in, or whoever has a right on the site named in the address. */
export type Caller = 'public' | 'signed-in' | Permission;

export type RouteRules<Params, Query, Body> = {
  readonly permission: Caller;
  readonly params?: Params;
  readonly query?: Query;
  /** The schema of a JSON body. */
  readonly body?: Body;
  /** Takes the raw body instead of JSON, up to so many bytes, of one of these content types. */
  readonly upload?: { readonly maxBytes: number; readonly types: readonly string[] };
  /** The version the change was made from must come in If-Match. */
  readonly ifMatch?: true;
  readonly maxBytes?: number;
};

export type RouteInput<Params, Query, Body> = Actor & {
  readonly params: Parsed<Params>;
  readonly query: Parsed<Query>;
  readonly body: Parsed<Body>;
  /** 0 unless the route asks for If-Match. */
  readonly version: number;
  readonly upload: { readonly bytes: Uint8Array; readonly type: string };
  readonly request: Request;
};

type Context = { readonly params: Promise<Record<string, string | string[]> | undefined> };

const nobody: Person = { id: '', name: '', email: '' };
const noMembership: Actor['membership'] = { role: 'trainer', mayOverride: false, title: '' };

const parse = <Of extends Schema>(schema: Of, value: unknown): z.output<Of> => {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const fields = result.error.issues.map((issue) => ({ field: issue.path.join('.'), reason: issue.message }));
  throw new AppError('invalid', 'Some of what was sent cannot be taken. Nothing was changed. See the fields named below.', { fields });
};

const findActor = async (permission: Caller, siteId: string): Promise<Actor> => {
  if (permission === 'public') return { person: nobody, membership: noMembership, siteId };
  const person = await currentPerson();
  if (person === null) throw new AppError('not-signed-in', 'You are not signed in any more. Nothing was changed and nothing you typed is lost. Sign in again in another tab, then try again here.');
  if (permission === 'signed-in') return { person, membership: noMembership, siteId };
  const membership = await membershipOn(person.id, siteId);
  if (membership === null) throw new AppError('not-found', 'There is no such site, or it is not yours. Nothing was changed.');
  mustBeAllowed(membership, permission);
  return { person, membership, siteId };
};

const answer = (value: unknown): Response => {
  if (value instanceof Response) return value;
  const headers = new Headers({ 'Content-Type': 'application/json; charset=utf-8', 'Cache-Control': 'no-store' });
  if (typeof value === 'object' && value !== null && 'version' in value) headers.set('ETag', `"${String(value.version)}"`);
  return new Response(JSON.stringify(value ?? {}), { status: 200, headers });
};

/**
 * Makes a route handler of one use case: origin, size and type, session, role on the site, schemas, then the use case, whose
 * failures become problem details. A route can leave none of it out.
 */
export const route = <Params extends Schema | undefined = undefined, Query extends Schema | undefined = undefined, Body extends Schema | undefined = undefined>(
  rules: RouteRules<Params, Query, Body>,
  useCase: (input: RouteInput<Params, Query, Body>) => Promise<unknown>,
) => async (request: Request, context: Context): Promise<Response> => {
  try {
    const writes = request.method !== 'GET' && request.method !== 'HEAD';
    if (writes) mustBeSameOrigin(request);
    // An address without a part in brackets has none, whatever the type says.
    const raw = (await context.params) ?? {};
    const actor = await findActor(rules.permission, String(raw['site'] ?? ''));
    const version = rules.ifMatch === true ? readVersion(request) : 0;
    const sent = writes ? await readBody(request, { json: rules.upload === undefined, maxBytes: rules.upload?.maxBytes ?? rules.maxBytes ?? 1_000_000, types: rules.upload?.types ?? [] }) : { json: undefined, bytes: new Uint8Array(), type: '' };
    const params = (rules.params === undefined ? undefined : parse(rules.params, raw)) as Parsed<Params>;
    const query = (rules.query === undefined ? undefined : parse(rules.query, Object.fromEntries(new URL(request.url).searchParams))) as Parsed<Query>;
    const body = (rules.body === undefined ? undefined : parse(rules.body, sent.json)) as Parsed<Body>;
    return answer(await useCase({ ...actor, params, query, body, version, upload: { bytes: sent.bytes, type: sent.type }, request }));
  } catch (error) {
    return problemResponse(await asAppError(error));
  }
};
