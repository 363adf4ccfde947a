import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { POST as accept } from '@/app/api/account/invitation/route';
import { POST as joinRoute } from '@/app/api/account/invitation/join/route';
import { DELETE as takeBack, POST as again } from '@/app/api/sites/[site]/people/invitations/[invitation]/route';
import { POST as inviteRoute } from '@/app/api/sites/[site]/people/invitations/route';
import { GET as readPlan } from '@/app/api/sites/[site]/plans/[plan]/route';
import { readInvitation } from '@/features/people/server/join';
import type { InvitationInput } from '@/features/people/schema';
import { env } from '@/lib/env';
import type { Problem } from '@/lib/http/problem';
import { checkSignIn } from '@/lib/server/check-sign-in';
import { InvitationRow } from '@/models/invitation';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { seedDatabase } from '@/tests/setup/demo-database';
import { call, cookieIn, cookieOf } from './in-request';
import { catchMail, type Catcher } from './mail-catcher';

vi.mock('@/lib/env', async (load) => {
  const real = await load<typeof import('@/lib/env')>();
  return { ...real, env: vi.fn(real.env) };
});

let catcher: Catcher;
const real = env();
const withMail = (url: string | undefined): void => { vi.mocked(env).mockReturnValue({ ...real, SMTP_URL: url, MAIL_FROM: 'Tamis <tamis@tamis.example>' }); };

beforeAll(async () => { catcher = await catchMail(); });
afterAll(() => catcher.stop());
beforeEach(async () => {
  await seedDatabase();
  catcher.mails.length = 0;
  catcher.refuse(false);
  withMail(catcher.url);
});

const site = 'lantern-yard';
const sousChef: InvitationInput = { email: 'noor@lanternyard.example', role: 'chef', title: 'sous-chef', mayOverride: true };
const password = 'copper kettle at noon';
const dayMs = 24 * 60 * 60 * 1000;

const invite = async (body: unknown = sousChef, as = 'marguerite-adeyemi'): Promise<Response> => call(inviteRoute, { method: 'POST', params: { site }, cookie: await cookieOf(as), body });
const tokenIn = (mail = catcher.mails.at(-1)): string => /\/invitation\/([\w-]+)/.exec(mail?.text ?? '')?.[1] ?? '';
const acceptWith = (token: string, more: object = {}): Promise<Response> => call(accept, { method: 'POST', body: { token, name: 'Noor Castellan', password, ...more } });
const problemOf = async (response: Response): Promise<Problem> => (await response.json()) as Problem;
const inviteAndRead = async (body: unknown = sousChef): Promise<string> => {
  expect((await invite(body)).status).toBe(200);
  return tokenIn();
};

describe('an invitation', () => {
  it('comes by e-mail with a link to this Tamis, and lets its reader in once, as what was said', async () => {
    const token = await inviteAndRead();
    expect(catcher.mails).toHaveLength(1);
    expect(catcher.mails[0]).toMatchObject({ subject: 'Marguerite Adeyemi invites you to Lantern Yard', to: { value: [{ address: 'noor@lanternyard.example' }] }, from: { value: [{ address: 'tamis@tamis.example' }] }, html: false });
    expect(catcher.mails[0]?.text).toContain(`${real.NEXTAUTH_URL}/invitation/${token}\n`);

    const response = await acceptWith(token);
    expect([response.status, await response.json()]).toEqual([200, { siteId: site, role: 'chef' }]);
    const person = await PersonRow.findOne({ where: { email: sousChef.email } });
    expect(await MembershipRow.findOne({ where: { siteId: site, personId: person?.id ?? '' } })).toMatchObject({ role: 'chef', title: 'sous-chef', mayOverride: true });
    const cookie = cookieIn(response.headers.get('set-cookie') ?? '');
    expect((await call(readPlan, { method: 'GET', params: { site, plan: 'dinner' }, cookie })).status).toBe(200);
    expect((await checkSignIn('Noor@LanternYard.example', password, '')).kind).toBe('right');

    expect([(await acceptWith(token)).status, await readInvitation(token, new Date())]).toEqual([404, null]);
  });

  it('is kept as a digest, so that who reads the table cannot join', async () => {
    const token = await inviteAndRead();
    const rows = JSON.stringify(await InvitationRow.findAll());
    expect(rows).not.toContain(token);
    expect(token).toMatch(/^[\w-]{32}$/);
  });

  it('works for seven days and not a moment longer', async () => {
    const token = await inviteAndRead();
    const { expiresAt } = (await InvitationRow.findOne({ where: { siteId: site } })) ?? { expiresAt: new Date(0) };
    expect(Math.abs(expiresAt.getTime() - Date.now() - 7 * dayMs)).toBeLessThan(60_000);
    expect(await readInvitation(token, new Date(expiresAt.getTime() - 1))).not.toBeNull();
    expect(await readInvitation(token, expiresAt)).toBeNull();
    await InvitationRow.update({ expiresAt: new Date(Date.now() - 1) }, { where: { siteId: site } });
    expect((await acceptWith(token)).status).toBe(404);
    expect(await PersonRow.count({ where: { email: sousChef.email } })).toBe(0);
  });

  it('lets one of two in who open it at the same moment', async () => {
    const token = await inviteAndRead();
    const statuses = (await Promise.all([acceptWith(token), acceptWith(token, { name: 'Somebody Else' })])).map(({ status }) => status);
    expect(statuses.toSorted()).toEqual([200, 404]);
    expect(await PersonRow.count({ where: { email: sousChef.email } })).toBe(1);
  });

  it.each(['', 'x', '__proto__', 'f'.repeat(64), 'a'.repeat(200), 'a'.repeat(201)])('with a made-up token leads nowhere: %j', async (token) => {
    await inviteAndRead();
    expect([404, 422]).toContain((await acceptWith(token)).status);
  });

  it.each<readonly [string, object, string]>([
    ['a short password', { password: 'short' }, 'password'], ['a password that is one’s own address', { password: 'noor@lanternyard.example' }, 'password'], ['no name', { name: '  ' }, 'name'],
  ])('waits while there is %s, and says so on the field', async (_what, more, field) => {
    const token = await inviteAndRead();
    const response = await acceptWith(token, more);
    expect([response.status, (await problemOf(response)).fields?.map((reason) => reason.field)]).toEqual([422, [field]]);
    expect((await acceptWith(token)).status).toBe(200);
  });
});

describe('inviting', () => {
  it.each<readonly [string, unknown, string]>([
    ['somebody who is here already', { ...sousChef, email: 'INES@lanternyard.example' }, 'email'],
    ['no address', { ...sousChef, email: 'noor' }, 'email'],
    ['two addresses at once', { ...sousChef, email: 'noor@lanternyard.example, bram@pilgrimsoven.example' }, 'email'],
    ['an address that carries a line of its own', { ...sousChef, email: 'noor@lanternyard.example\r\nBcc: all@elsewhere.example' }, 'email'],
    ['a role that there is not', { ...sousChef, role: 'waiter' }, 'role'],
  ])('%s sends nothing and says why', async (_what, body, field) => {
    const response = await invite(body);
    expect([response.status, (await problemOf(response)).fields?.map((reason) => reason.field)]).toEqual([422, [field]]);
    expect([catcher.mails.length, await InvitationRow.count()]).toEqual([0, 0]);
  });

  it('puts a name in the subject as one line, whatever it holds', async () => {
    await PersonRow.update({ name: 'Marguerite\r\nBcc: all@elsewhere.example' }, { where: { id: 'marguerite-adeyemi' } });
    await inviteAndRead();
    expect(catcher.mails[0]?.headers.has('bcc')).toBe(false);
    expect(catcher.mails[0]?.subject).toBe('Marguerite Bcc: all@elsewhere.example invites you to Lantern Yard');
  });

  it('leaves nothing behind when the mail server does not take it', async () => {
    catcher.refuse(true);
    vi.spyOn(process.stderr, 'write').mockReturnValue(true);
    const response = await invite();
    vi.mocked(process.stderr.write).mockRestore();
    expect([response.status, (await problemOf(response)).detail]).toEqual([503, expect.stringMatching(/^The mail server did not take the e-mail for noor@lanternyard\.example\./)]);
    expect(await InvitationRow.count()).toBe(0);
  });

  it('leaves the invitation before it as it was, when the next mail is not taken', async () => {
    const token = await inviteAndRead();
    const { id } = (await InvitationRow.findOne({ where: { siteId: site } })) ?? { id: '' };
    catcher.refuse(true);
    vi.spyOn(process.stderr, 'write').mockReturnValue(true);
    const response = await call(again, { method: 'POST', params: { site, invitation: id }, cookie: await cookieOf('marguerite-adeyemi') });
    vi.mocked(process.stderr.write).mockRestore();
    expect([response.status, (await acceptWith(token)).status]).toEqual([503, 200]);
  });

  it('says so when there is no mail server', async () => {
    withMail(undefined);
    expect((await problemOf(await invite())).detail).toMatch(/^Tamis has no mail server here/);
    expect(await InvitationRow.count()).toBe(0);
  });

  it('somebody again makes only the newest link work', async () => {
    const first = await inviteAndRead();
    const { id } = (await InvitationRow.findOne({ where: { siteId: site } })) ?? { id: '' };
    expect((await call(again, { method: 'POST', params: { site, invitation: id }, cookie: await cookieOf('marguerite-adeyemi') })).status).toBe(200);
    const second = tokenIn();
    expect([await InvitationRow.count(), (await acceptWith(first)).status, (await acceptWith(second)).status]).toEqual([1, 404, 200]);
  });

  it('can be taken back', async () => {
    const token = await inviteAndRead();
    const { id } = (await InvitationRow.findOne({ where: { siteId: site } })) ?? { id: '' };
    expect((await call(takeBack, { method: 'DELETE', params: { site, invitation: id }, cookie: await cookieOf('marguerite-adeyemi') })).status).toBe(200);
    expect((await acceptWith(token)).status).toBe(404);
  });

  it('stops after thirty in an hour, and says when to go on', async () => {
    const statuses: number[] = [];
    for (let sent = 1; sent <= 31; sent += 1) statuses.push((await call(inviteRoute, { method: 'POST', params: { site: 'pilgrims-oven' }, cookie: await cookieOf('halima-pettersen'), body: { ...sousChef, email: `guest-${sent}@pilgrimsoven.example` } })).status);
    expect([statuses.slice(0, 30).every((status) => status === 200), statuses[30], catcher.mails.length]).toEqual([true, 429, 30]);
  });
});

describe('somebody who signs in already', () => {
  const bram: InvitationInput = { email: 'bram@pilgrimsoven.example', role: 'trainer', title: '', mayOverride: false };
  const joinAs = async (person: string, token: string): Promise<Response> => call(joinRoute, { method: 'POST', cookie: await cookieOf(person), body: { token } });

  it('joins as who they are, and keeps their password', async () => {
    const token = await inviteAndRead(bram);
    const before = (await PersonRow.findByPk('bram-okonjo'))?.passwordHash;
    expect(await (await joinAs('bram-okonjo', token)).json()).toEqual({ siteId: site, role: 'trainer' });
    expect(await MembershipRow.findOne({ where: { siteId: site, personId: 'bram-okonjo' } })).toMatchObject({ role: 'trainer' });
    expect((await PersonRow.findByPk('bram-okonjo'))?.passwordHash).toBe(before);
    expect((await joinAs('bram-okonjo', token)).status).toBe(404);
  });

  it('is not given another password by whoever holds the link', async () => {
    const token = await inviteAndRead(bram);
    const response = await acceptWith(token);
    expect([response.status, (await problemOf(response)).detail]).toEqual([409, expect.stringContaining('signs in already')]);
    expect((await joinAs('bram-okonjo', token)).status).toBe(200);
  });

  it('does not join by an invitation for somebody else', async () => {
    const token = await inviteAndRead();
    const response = await joinAs('bram-okonjo', token);
    expect([response.status, (await problemOf(response)).detail]).toEqual([403, expect.stringContaining('This invitation is for noor@lanternyard.example')]);
    expect(await MembershipRow.count({ where: { siteId: site, personId: 'bram-okonjo' } })).toBe(0);
  });
});
