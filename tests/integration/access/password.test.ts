import { beforeEach, describe, expect, it } from 'vitest';
import { POST as changePassword } from '@/app/api/account/password/route';
import { GET as readPlan } from '@/app/api/sites/[site]/plans/[plan]/route';
import type { Problem } from '@/lib/http/problem';
import { checkSignIn } from '@/lib/server/check-sign-in';
import { PersonRow } from '@/models/person';
import { demoPassword, seedDatabase } from '@/tests/setup/demo-database';
import { call, cookieIn, cookieOf } from './in-request';

beforeEach(seedDatabase);

const wanted = 'copper kettle at noon';
let addresses = 0;
/** Another place each time, so that the tries of one test do not slow another down. */
const elsewhere = (): string => `198.51.100.${(addresses += 1)}`;

const change = (cookie: string, body: unknown, address = elsewhere()): Promise<Response> => call(changePassword, { method: 'POST', cookie, body, headers: { 'x-forwarded-for': address } });
const isIn = async (cookie: string): Promise<boolean> => (await call(readPlan, { method: 'GET', params: { site: 'lantern-yard', plan: 'dinner' }, cookie })).status === 200;
const letsIn = async (password: string): Promise<string> => (await checkSignIn('ines@lanternyard.example', password, elsewhere())).kind;

describe('changing one’s password', () => {
  it('ends every session there was, at once, and keeps this browser in with a new one', async () => {
    const [here, there] = [await cookieOf('ines-okafor'), await cookieOf('ines-okafor')];
    const response = await change(here, { current: demoPassword, wanted });
    const fresh = response.headers.get('set-cookie') ?? '';
    expect(response.status).toBe(200);
    expect(fresh).toMatch(/; Path=\/; Max-Age=1209600; HttpOnly; SameSite=Lax$/);
    expect([await isIn(here), await isIn(there), await isIn(cookieIn(fresh))]).toEqual([false, false, true]);
    expect([await letsIn(demoPassword), await letsIn(wanted)]).toEqual(['wrong', 'right']);
  });

  it('lets nobody in who was halfway through signing in with the old one', async () => {
    const halfway = await checkSignIn('ines@lanternyard.example', demoPassword, elsewhere());
    await change(await cookieOf('ines-okafor'), { current: demoPassword, wanted });
    if (halfway.kind !== 'right') throw new Error('The old password did not fit.');
    const { startSession, personOfSession } = await import('@/lib/server/session');
    expect(await personOfSession(await startSession(halfway.person))).toBeNull();
  });

  it('leaves everybody else in', async () => {
    const tomas = await cookieOf('tomas-brandt');
    await change(await cookieOf('ines-okafor'), { current: demoPassword, wanted });
    expect(await isIn(tomas)).toBe(true);
  });

  it.each<readonly [string, { current: string; wanted: string }, string]>([
    ['without the one there is', { current: 'not the password', wanted }, 'current'],
    ['to one that is short', { current: demoPassword, wanted: 'short' }, 'wanted'],
    ['to one that is tried first', { current: demoPassword, wanted: 'Password2026' }, 'wanted'],
    ['to one’s own name', { current: demoPassword, wanted: 'ines-okafor-1' }, 'wanted'],
    ['to the same', { current: demoPassword, wanted: demoPassword }, 'wanted'],
    ['to an endless one', { current: demoPassword, wanted: 'long words '.repeat(40) }, 'wanted'],
  ])('%s is refused on its field, and nothing ends', async (_what, body, field) => {
    const here = await cookieOf('ines-okafor');
    const before = (await PersonRow.findByPk('ines-okafor'))?.passwordHash;
    const response = await change(here, body);
    expect([response.status, ((await response.json()) as Problem).fields?.map((reason) => reason.field), response.headers.get('set-cookie')]).toEqual([422, [field], null]);
    expect([await isIn(here), (await PersonRow.findByPk('ines-okafor'))?.passwordHash]).toEqual([true, before]);
  });

  it('counts wrong ones as signing in does, so that an open tablet is no place to guess', async () => {
    const [here, address] = [await cookieOf('ines-okafor'), elsewhere()];
    for (let tried = 1; tried <= 5; tried += 1) expect((await change(here, { current: `guess ${tried}`, wanted }, address)).status).toBe(422);
    const response = await change(here, { current: demoPassword, wanted }, address);
    expect([response.status, Number(response.headers.get('retry-after')) > 0, ((await response.json()) as Problem).detail]).toEqual([429, true, expect.stringContaining('Wait 15 minutes')]);
    expect((await checkSignIn('ines@lanternyard.example', demoPassword, address)).kind).toBe('wait');
  });
});
