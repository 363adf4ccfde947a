import { readdirSync } from 'node:fs';
import path from 'node:path';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { may, permissions, roles, type Permission, type Role } from '@/lib/domain/roles/permissions';
import { ChangeRow } from '@/models/change';
import { InvitationRow } from '@/models/invitation';
import { SiteRow } from '@/models/site';
import { seedDatabase } from '@/tests/setup/demo-database';
import { denials, type Denial } from './denials';
import { call, cookieOf } from './in-request';

const api = path.resolve(import.meta.dirname, '../../../app/api');
const httpMethods = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE'];

const routes = readdirSync(api, { recursive: true, encoding: 'utf8' }).filter((file) => path.basename(file) === 'route.ts').map((file) => path.dirname(file).split(path.sep).join('/')).sort();

const handlersOf = async (route: string): Promise<Readonly<Record<string, unknown>>> =>
  (await import(/* @vite-ignore */ path.join(api, route, 'route.ts'))) as Readonly<Record<string, unknown>>;

const site = 'lantern-yard';
const personWith: Readonly<Record<Role, string>> = { owner: 'marguerite-adeyemi', chef: 'ines-okafor', installer: 'femi-lindqvist', trainer: 'tomas-brandt' };
const elsewhere = ['halima-pettersen', 'bram-okonjo'];
const cookies = new Map<string, string>();
const cookieFor = (person: string): { readonly cookie: string } => ({ cookie: cookies.get(person) ?? '' });

const isOfSite = (denial: Denial): denial is Denial & { readonly permission: Permission } => Object.hasOwn(permissions, denial.permission);
const ofSites = denials.filter(isOfSite);
const name = ({ route, method, body }: Denial): string => `${method} ${route}${route.endsWith('fixes') ? ` ${(body as { fix: { kind: string } }).fix.kind}` : ''}`;

type As = { readonly cookie?: string; readonly site?: string; readonly version?: number };

const callAs = async (denial: Denial, { cookie, site: where = site, version }: As = {}): Promise<Response> => {
  const handlers = await handlersOf(denial.route);
  return call(handlers[denial.method], {
    method: denial.method, path: `/api/${denial.route.replace('[site]', where)}`, ...(denial.route.includes('[') ? { params: { site: where, ...denial.foreign, ...denial.own } } : {}),
    ...(denial.body === undefined || denial.method === 'DELETE' ? {} : { body: denial.body }), ...(cookie === undefined ? {} : { cookie }), ...(version === undefined ? {} : { headers: { 'if-match': `"${version}"` } }),
  });
};

const codeOf = async (response: Response): Promise<unknown> => ((await response.json()) as { code?: unknown }).code;

/** Everything that was ever changed, as one number for each site. */
const changesSoFar = async (): Promise<readonly number[]> => [await ChangeRow.count(), ...(await SiteRow.findAll({ order: ['id'] })).map(({ revision }) => revision)];

beforeAll(async () => {
  await seedDatabase();
  await InvitationRow.create({ id: 'elsewhere', siteId: 'pilgrims-oven', email: 'guest@pilgrimsoven.example', role: 'chef', tokenHash: 'f'.repeat(64), expiresAt: new Date('2099-01-01T00:00:00.000Z') });
  for (const person of [...Object.values(personWith), ...elsewhere]) cookies.set(person, await cookieOf(person));
});

describe('the list of who may call what', () => {
  it.each(routes)('has an entry for every method of %s, and no other', async (route) => {
    const exported = Object.keys(await handlersOf(route)).filter((key) => httpMethods.includes(key)).sort();
    const listed = [...new Set(denials.filter((denial) => denial.route === route).map(({ method }) => method))].sort();
    expect(listed).toEqual(exported);
  });

  it('names only routes that there are', () => {
    expect(denials.map(({ route }) => route).filter((route) => !routes.includes(route))).toEqual([]);
  });

  it('says why, where no right is asked for', () => {
    expect(denials.filter((denial) => !isOfSite(denial) && (denial.why ?? '') === '').map(name)).toEqual([]);
  });

  it('knows, for every resource with an id, one call that comes as far as another site’s row', () => {
    const resources = [...new Set(ofSites.filter(({ route }) => route.replace('[site]', '').includes('[')).map(({ route }) => route))];
    const reached = ofSites.filter(reachesRow).map(({ route }) => route);
    expect(resources.filter((route) => !reached.includes(route) && !ofSites.some((denial) => denial.route === route && denial.own !== undefined))).toEqual([]);
  });
});

/** Without a body that the route takes, a call is refused before any row is looked for. */
const reachesRow = (denial: Denial): boolean => denial.foreign !== undefined && (denial.method !== 'PUT' || denial.body !== undefined);

describe('somebody who is not signed in', () => {
  let before: readonly number[];
  beforeEach(async () => { before = await changesSoFar(); });

  it.each(denials.filter(({ permission }) => permission !== 'public').map((denial) => [name(denial), denial] as const))('is refused %s, and nothing changes', async (_name, denial) => {
    const response = await callAs(denial, { version: 1 });
    expect([response.status, await codeOf(response)]).toEqual([401, 'not-signed-in']);
    expect(await changesSoFar()).toEqual(before);
  });
});

describe('somebody of another site', () => {
  let before: readonly number[];
  beforeEach(async () => { before = await changesSoFar(); });

  it.each(ofSites.map((denial) => [name(denial), denial] as const))('is not told by %s that there is this one', async (_name, denial) => {
    for (const person of elsewhere) {
      const response = await callAs(denial, { ...cookieFor(person), version: 1 });
      const missing = await callAs(denial, { ...cookieFor(person), site: 'nowhere-at-all', version: 1 });
      expect(response.status).toBe(404);
      expect([missing.status, await missing.text()]).toEqual([404, await response.text()]);
    }
    expect(await changesSoFar()).toEqual(before);
  });

  it.each(ofSites.filter(reachesRow).map((denial) => [name(denial), denial] as const))('whose row it is, is safe from the owner of this one by %s', async (_name, denial) => {
    const response = await callAs(denial, { ...cookieFor(personWith.owner), version: 1 });
    expect([response.status, await codeOf(response)]).toEqual([404, 'not-found']);
    expect(await changesSoFar()).toEqual(before);
  });
});

describe('a role that may not', () => {
  const refused = ofSites.flatMap((denial) => roles.filter((role) => !may({ role, mayOverride: true }, denial.permission)).map((role) => [role, name(denial), denial] as const));

  it.each(refused)('%s: is refused %s in words, and nothing changes', async (role, _name, denial) => {
    const before = await changesSoFar();
    const response = await callAs(denial, { ...cookieFor(personWith[role]), version: 1 });
    const problem = (await response.json()) as { code: string; detail: string };
    expect([response.status, problem.code]).toEqual([403, 'not-allowed']);
    expect(problem.detail).toMatch(/^This is not for .* of this site to do\. Nothing was changed\. /);
    expect(await changesSoFar()).toEqual(before);
  });
});

describe('a role that may', () => {
  const allowed = ofSites.flatMap((denial) => roles.filter((role) => may({ role, mayOverride: false }, denial.permission)).map((role) => [role, name(denial), denial] as const));

  it.each(allowed)('%s: is let through to %s', async (role, _name, denial) => {
    const response = await callAs(denial, { ...cookieFor(personWith[role]), version: 1 });
    expect([401, 403, 500]).not.toContain(response.status);
  });
});
