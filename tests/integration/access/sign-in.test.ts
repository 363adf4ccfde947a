import { verify } from '@node-rs/argon2';
import { encode } from 'next-auth/jwt';
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { GET as readAuth, POST as postAuth } from '@/app/api/auth/[...nextauth]/route';
import { POST as signOut } from '@/app/api/account/sign-out/route';
import { GET as readPlan } from '@/app/api/sites/[site]/plans/[plan]/route';
import { env } from '@/lib/env';
import { currentPerson } from '@/lib/server/current-person';
import { sessionCookieName } from '@/lib/server/session-cookie';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { SessionRow } from '@/models/session';
import { demoPassword, seedDatabase } from '@/tests/setup/demo-database';
import { call, cookieIn, cookieOf } from './in-request';

vi.mock('@node-rs/argon2', async (load) => {
  const real = await load<typeof import('@node-rs/argon2')>();
  return { ...real, verify: vi.fn(real.verify) };
});

beforeAll(seedDatabase);

const ines = 'ines@lanternyard.example';

type Answer = { readonly status: number; readonly url: string; readonly cookies: readonly string[]; readonly session: string | undefined };

/** As the form does: first the token against forged posts, then the two words. */
const signIn = async (email: string, password: string, address = '198.51.100.1'): Promise<Answer> => {
  const token = await call(readAuth, { method: 'GET', path: '/api/auth/csrf', params: { nextauth: ['csrf'] } });
  const { csrfToken } = (await token.json()) as { csrfToken: string };
  const response = await call(postAuth, {
    method: 'POST', path: '/api/auth/callback/credentials', params: { nextauth: ['callback', 'credentials'] }, cookie: token.headers.getSetCookie().map(cookieIn).join('; '),
    headers: { 'content-type': 'application/x-www-form-urlencoded', 'x-forwarded-for': address }, body: new URLSearchParams({ csrfToken, email, password, json: 'true', callbackUrl: 'http://127.0.0.1:3000' }),
  });
  const cookies = response.headers.getSetCookie();
  return { status: response.status, url: ((await response.json()) as { url: string }).url, cookies, session: cookies.find((cookie) => cookie.startsWith(`${sessionCookieName()}=`)) };
};

const errorOf = ({ url }: Answer): string | null => new URL(url).searchParams.get('error');

/** Who a request with this cookie is. */
const whoIs = async (cookie: string): Promise<string | null> => {
  let name: string | null = null;
  await call(async () => {
    name = (await currentPerson())?.name ?? null;
    return new Response();
  }, { method: 'GET', cookie });
  return name;
};

describe('the right password', () => {
  it('gives a cookie that no script can read, that other sites’ forms do not send, and that says who one is', async () => {
    const { session } = await signIn(ines, demoPassword);
    expect(session).toMatch(/; HttpOnly/i);
    expect(session).toMatch(/; SameSite=Lax/i);
    expect(session).toMatch(/; Path=\//i);
    expect(await whoIs(cookieIn(session ?? ''))).toBe('Ines Okafor');
  });

  it('is the same for an e-mail in other letters and with space around it', async () => {
    expect((await signIn(' INES@LanternYard.example ', demoPassword)).session).toBeDefined();
  });

  it('does not help somebody who spells the e-mail as only the table would take for equal', async () => {
    for (const spelling of ['ｉｎｅｓ@lanternyard.example', 'in\u00ades@lanternyard.example']) {
      const answer = await signIn(spelling, demoPassword);
      expect([errorOf(answer), answer.session]).toEqual(['CredentialsSignin', undefined]);
    }
  });
});

describe('a wrong password and an unknown person', () => {
  beforeEach(() => {
    vi.mocked(verify).mockClear();
  });

  it('get the same answer after the same work', async () => {
    const wrong = await signIn(ines, 'not the password', '198.51.100.2');
    const unknown = await signIn('nobody@lanternyard.example', 'not the password', '198.51.100.2');
    const shape = ({ status, url, cookies, session }: Answer) => ({ status, url, names: cookies.map((cookie) => cookie.split('=')[0]), session });
    expect(shape(unknown)).toEqual(shape(wrong));
    expect([errorOf(wrong), wrong.session]).toEqual(['CredentialsSignin', undefined]);

    const work = vi.mocked(verify).mock.calls.map(([hash]) => /^\$argon2id\$v=19\$m=19456,t=2,p=1\$/.exec(String(hash))?.[0]);
    expect(work).toEqual(['$argon2id$v=19$m=19456,t=2,p=1$', '$argon2id$v=19$m=19456,t=2,p=1$']);
  });

  it.each([ines, 'nobody-else@lanternyard.example'])('have to wait after the fifth try from one place (%s), whatever is typed then', async (email) => {
    const address = `203.0.113.${email.length}`;
    for (let tried = 1; tried <= 5; tried += 1) expect(errorOf(await signIn(email, 'not the password', address))).toBe('CredentialsSignin');
    vi.mocked(verify).mockClear();
    for (const password of ['not the password', demoPassword]) {
      const answer = await signIn(email.toUpperCase(), password, address);
      const seconds = Number(/^wait-(\d+)$/.exec(errorOf(answer) ?? '')?.[1]);
      expect(seconds).toBeGreaterThan(14 * 60);
      expect(seconds).toBeLessThanOrEqual(15 * 60);
      expect(answer.session).toBeUndefined();
    }
    expect(verify).not.toHaveBeenCalled();
  });

  it('count when they are tried all at once as well', async () => {
    const answers = await Promise.all(Array.from({ length: 20 }, () => signIn('halima@pilgrimsoven.example', 'not the password', '203.0.113.50')));
    expect(answers.filter((answer) => errorOf(answer) === 'CredentialsSignin')).toHaveLength(5);
    expect(verify).toHaveBeenCalledTimes(5);
  });

  it('from one place do not keep the person out of another', async () => {
    for (let tried = 1; tried <= 6; tried += 1) await signIn('bram@pilgrimsoven.example', 'not the password', '203.0.113.60');
    expect((await signIn('bram@pilgrimsoven.example', demoPassword, '203.0.113.61')).session).toBeDefined();
  });

  it('from many places have to wait after the thirtieth', async () => {
    const errors: (string | null)[] = [];
    for (let tried = 1; tried <= 31; tried += 1) errors.push(errorOf(await signIn('femi@lindqvist.example', 'not the password', `192.0.2.${tried}`)));
    expect(errors.slice(0, 30).every((error) => error === 'CredentialsSignin')).toBe(true);
    expect(errors[30]).toMatch(/^wait-/);
  });

  it('have to wait when one place goes through many accounts', async () => {
    const errors: (string | null)[] = [];
    for (let tried = 1; tried <= 51; tried += 1) errors.push(errorOf(await signIn(`person-${tried}@lanternyard.example`, 'not the password', '203.0.113.70')));
    expect([errors[49], errors[50]?.slice(0, 5)]).toEqual(['CredentialsSignin', 'wait-']);
  });

  it('are forgotten after the right one, so that a slip of the finger adds up to nothing', async () => {
    for (let round = 1; round <= 3; round += 1) {
      for (let tried = 1; tried <= 4; tried += 1) await signIn('tomas@brandt.example', 'not the password', '203.0.113.80');
      expect((await signIn('tomas@brandt.example', demoPassword, '203.0.113.80')).session).toBeDefined();
    }
  });
});

describe('a session', () => {
  const planOf = (cookie: string): Promise<Response> => call(readPlan, { method: 'GET', params: { site: 'lantern-yard', plan: 'dinner' }, cookie });

  it('ends at once by signing out, here and not on another device, and its cookie is worth nothing after', async () => {
    const [here, there] = [await cookieOf('ines-okafor'), await cookieOf('ines-okafor')];
    const response = await call(signOut, { method: 'POST', cookie: here, headers: { 'content-type': 'application/x-www-form-urlencoded' }, body: '' });
    expect([response.status, response.headers.get('location')]).toEqual([303, '/sign-in?left=1']);
    expect(response.headers.get('set-cookie')).toMatch(/^next-auth\.session-token=; Path=\/; Max-Age=0; HttpOnly; SameSite=Lax$/);
    expect([(await planOf(here)).status, (await planOf(there)).status]).toEqual([401, 200]);
  });

  it('ends by the library’s own way of signing out too', async () => {
    const here = await cookieOf('ines-okafor');
    const token = await call(readAuth, { method: 'GET', path: '/api/auth/csrf', params: { nextauth: ['csrf'] }, cookie: here });
    const { csrfToken } = (await token.json()) as { csrfToken: string };
    await call(postAuth, {
      method: 'POST', path: '/api/auth/signout', params: { nextauth: ['signout'] }, cookie: [here, ...token.headers.getSetCookie().map(cookieIn)].join('; '),
      headers: { 'content-type': 'application/x-www-form-urlencoded' }, body: new URLSearchParams({ csrfToken, json: 'true' }),
    });
    expect((await planOf(here)).status).toBe(401);
  });

  it('is not ended by a page of another site', async () => {
    const here = await cookieOf('ines-okafor');
    const response = await call(signOut, { method: 'POST', cookie: here, headers: { 'origin': 'https://elsewhere.example', 'sec-fetch-site': 'cross-site', 'content-type': 'application/x-www-form-urlencoded' }, body: '' });
    expect([response.status, (await planOf(here)).status]).toEqual([403, 200]);
  });

  it('ends with the person, and reaches a site no longer than the person is on it', async () => {
    const [bram, ines] = [await cookieOf('bram-okonjo'), await cookieOf('ines-okafor')];
    await PersonRow.destroy({ where: { id: 'bram-okonjo' } });
    expect(await whoIs(bram)).toBeNull();
    await MembershipRow.destroy({ where: { personId: 'ines-okafor' } });
    expect([await whoIs(ines), (await planOf(ines)).status]).toEqual(['Ines Okafor', 404]);
  });

  it.each<readonly [string, (claims: { sessionId: string; personId: string; sessionVersion: number }) => Promise<string>]>([
    ['signed with another secret', (claims) => encode({ token: { claims }, secret: 'x'.repeat(40) })],
    ['that has run out', (claims) => encode({ token: { claims }, secret: env().NEXTAUTH_SECRET, maxAge: -60 })],
    ['of a sign-in that never was', (claims) => encode({ token: { claims: { ...claims, sessionId: 'made-up' } }, secret: env().NEXTAUTH_SECRET })],
    ['of somebody else’s sign-in', (claims) => encode({ token: { claims: { ...claims, personId: 'marguerite-adeyemi' } }, secret: env().NEXTAUTH_SECRET })],
    ['without any claims', () => encode({ token: {}, secret: env().NEXTAUTH_SECRET })],
    ['that is no token at all', async () => 'eyJhbGciOiJub25lIn0.e30.'],
  ])('%s is nobody’s', async (_what, forge) => {
    await SessionRow.create({ id: 'real', personId: 'tomas-brandt', createdAt: new Date() });
    const forged = await forge({ sessionId: 'real', personId: 'tomas-brandt', sessionVersion: 1 });
    expect(await whoIs(`${sessionCookieName()}=${forged}`)).toBeNull();
    await SessionRow.destroy({ where: { id: 'real' } });
  });
});
