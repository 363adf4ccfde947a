import { beforeEach, describe, expect, it } from 'vitest';
import { DELETE as removeRoute, PUT as changeRoute } from '@/app/api/sites/[site]/people/[person]/route';
import { POST as lookIn } from '@/app/api/sites/[site]/plans/[plan]/presence/route';
import { removeMember } from '@/features/people/server/change-member';
import { listPeople } from '@/features/people/server/list-people';
import type { MemberInput } from '@/features/people/schema';
import type { Problem } from '@/lib/http/problem';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { MembershipRow } from '@/models/membership';
import { seedDatabase } from '@/tests/setup/demo-database';
import { call, cookieOf } from './in-request';

beforeEach(seedDatabase);

const site = 'lantern-yard';
const owner = 'marguerite-adeyemi';
const chef: MemberInput = { role: 'chef', title: 'sous-chef', mayOverride: true };
const memberOf = (personId: string): Promise<MembershipRow | null> => MembershipRow.findOne({ where: { siteId: site, personId } });

type As = { readonly as?: string; readonly version?: number };

const change = async (person: string, body: MemberInput, { as = owner, version = 1 }: As = {}): Promise<Response> =>
  call(changeRoute, { method: 'PUT', params: { site, person }, cookie: await cookieOf(as), body, headers: { 'if-match': `"${version}"` } });
const remove = async (person: string, { as = owner, version = 1 }: As = {}): Promise<Response> =>
  call(removeRoute, { method: 'DELETE', params: { site, person }, cookie: await cookieOf(as), headers: { 'if-match': `"${version}"` } });
const problemOf = async (response: Response): Promise<Problem> => (await response.json()) as Problem;

describe('what somebody is on a site', () => {
  it('is changed by the owner, counts from the next press, and is told by the history', async () => {
    const tomas = await cookieOf('tomas-brandt');
    expect((await change('tomas-brandt', chef)).status).toBe(200);
    expect(await memberOf('tomas-brandt')).toMatchObject({ role: 'chef', title: 'sous-chef', mayOverride: true, version: 2 });
    expect(await lastChangeOf(site, 'membership', 'tomas-brandt')).toMatchObject({ by: 'Marguerite Adeyemi', summary: 'Tomas Brandt is sous-chef, and may override a stop' });
    await remove('tomas-brandt', { version: 2 });
    expect((await call(lookIn, { method: 'POST', params: { site, plan: 'dinner' }, cookie: tomas })).status).toBe(404);
  });

  it.each(['owner', 'installer', 'trainer'] as const)('has no override to itself as %s: only a chef’s is said', async (role) => {
    await change('tomas-brandt', { role, title: '', mayOverride: true });
    expect(await memberOf('tomas-brandt')).toMatchObject({ role, mayOverride: false });
  });

  it('stays as it is on other sites', async () => {
    await change('femi-lindqvist', { role: 'owner', title: '', mayOverride: false });
    await remove('tomas-brandt');
    expect((await MembershipRow.findAll({ where: { siteId: 'pilgrims-oven' }, order: ['personId'] })).map(({ personId, role }) => [personId, role])).toEqual([
      ['bram-okonjo', 'chef'], ['femi-lindqvist', 'installer'], ['halima-pettersen', 'owner'], ['tomas-brandt', 'trainer'],
    ]);
  });

  it('is not changed on top of what another owner saved meanwhile', async () => {
    await change('ines-okafor', { role: 'owner', title: '', mayOverride: false });
    await change('tomas-brandt', chef, { as: 'ines-okafor' });
    const response = await change('tomas-brandt', { role: 'installer', title: '', mayOverride: false });
    expect([response.status, await problemOf(response)]).toMatchObject([412, { changed: { by: 'Ines Okafor' }, current: { role: 'chef', version: 2 } }]);
    expect((await remove('tomas-brandt')).status).toBe(412);
    expect(await memberOf('tomas-brandt')).toMatchObject({ role: 'chef', version: 2 });
  });
});

describe('the last owner', () => {
  it.each<readonly [string, () => Promise<Response>]>([
    ['is not taken off', () => remove(owner)],
    ['does not become something else', () => change(owner, { role: 'chef', title: '', mayOverride: true })],
  ])('%s', async (_what, press) => {
    const response = await press();
    expect([response.status, (await problemOf(response)).detail]).toEqual([409, expect.stringMatching(/^A site always has an owner/)]);
    expect(await memberOf(owner)).toMatchObject({ role: 'owner', version: 1 });
  });

  it('is still there when two owners take each other off at the same moment', async () => {
    await change('ines-okafor', { role: 'owner', title: '', mayOverride: false });
    const ownerActor = (id: string): Actor => ({ person: { id, name: '', email: '' }, membership: { role: 'owner', mayOverride: false, title: '' }, siteId: site });
    // Both are past the wrapper, which would say 404 to whoever asks a moment after being taken off.
    const results = await Promise.allSettled([
      removeMember(ownerActor(owner), { person: 'ines-okafor', version: 2 }), removeMember(ownerActor('ines-okafor'), { person: owner, version: 1 }),
    ]);
    expect(results.flatMap((result) => (result.status === 'rejected' ? [result.reason as unknown] : []))).toMatchObject([{ code: 'not-allowed' }]);
    expect(await MembershipRow.count({ where: { siteId: site, role: 'owner' } })).toBe(1);
  });

  it('can go once there is another', async () => {
    await change('ines-okafor', { role: 'owner', title: '', mayOverride: false });
    expect((await remove(owner)).status).toBe(200);
    expect(await memberOf(owner)).toBeNull();
  });
});

describe('the list of people', () => {
  it('shows everybody of this site and nobody else, owners first, and who looks', async () => {
    const { members } = await listPeople({ person: { id: owner, name: '', email: '' }, membership: { role: 'owner', mayOverride: false, title: '' }, siteId: site }, new Date());
    expect(members.map(({ name, role, isYou, isLastOwner }) => [name, role, isYou, isLastOwner])).toEqual([
      ['Marguerite Adeyemi', 'owner', true, true], ['Ines Okafor', 'chef', false, false], ['Femi Lindqvist', 'installer', false, false], ['Tomas Brandt', 'trainer', false, false],
    ]);
  });

  it('holds no password, no token and nothing else that opens a door', async () => {
    const people = await listPeople({ person: { id: owner, name: '', email: '' }, membership: { role: 'owner', mayOverride: false, title: '' }, siteId: site }, new Date());
    expect(JSON.stringify(people)).not.toMatch(/hash|argon2|token|session/i);
  });

  it('is the owner’s alone, whatever a page shows', async () => {
    await expect(listPeople({ person: { id: 'ines-okafor', name: '', email: '' }, membership: { role: 'chef', mayOverride: true, title: '' }, siteId: site }, new Date())).rejects.toMatchObject({ code: 'not-allowed' });
  });
});
