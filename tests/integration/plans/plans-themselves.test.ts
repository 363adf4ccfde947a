import { beforeEach, describe, expect, it } from 'vitest';
import { createPlan } from '@/features/board/server/create-plan';
import { deletePlan } from '@/features/board/server/delete-plan';
import { orderPlans } from '@/features/board/server/order-plans';
import { ping } from '@/features/board/server/presence';
import { readPlan } from '@/features/board/server/read-plan';
import { renamePlan } from '@/features/board/server/rename-plan';
import { setWeeklyTimes } from '@/features/board/server/set-weekly-times';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Plan } from '@/lib/domain/site/plan';
import { AppError } from '@/lib/http/errors';
import type { Actor } from '@/lib/server/actor';
import { readPlanVersion } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const membership = (role: Role): Actor['membership'] => ({ role, mayOverride: false, title: '' });
const ines: Actor = { person: { id: 'ines-okafor', name: 'Ines Okafor', email: '' }, membership: membership('chef'), siteId };
const femi: Actor = { person: { id: 'femi-lindqvist', name: 'Femi Lindqvist', email: '' }, membership: membership('installer'), siteId };

const plans = async (): Promise<readonly Plan[]> => (await loadSite(siteId))?.plans ?? [];
const planNamed = async (name: string): Promise<Plan> => {
  const plan = (await plans()).find((one) => one.name === name);
  if (plan === undefined) throw new Error(`There is no plan ${name}.`);
  return plan;
};
const refusal = async (work: Promise<unknown>): Promise<AppError> => {
  const error: unknown = await work.then(() => null, (thrown: unknown) => thrown);
  if (!(error instanceof AppError)) throw new Error(`Expected a refusal, got ${String(error)}`);
  return error;
};

describe('a new plan', () => {
  it('begins with the rules of an old one under ids of its own, last in order, without weekly times', async () => {
    const { id } = await createPlan(ines, { name: 'Sunday lunch', from: 'lunch' });
    const [lunch, made] = [await planNamed('Lunch'), await planNamed('Sunday lunch')];
    const bare = (plan: Plan): readonly object[] => plan.rules.map(({ id: _id, ...rule }) => rule);
    expect(made.id).toBe(id);
    expect(bare(made)).toEqual(bare(lunch));
    expect(made.rules.some((rule) => lunch.rules.some((other) => other.id === rule.id))).toBe(false);
    expect(made.offers?.toSorted()).toEqual(lunch.offers?.toSorted());
    expect((await plans()).at(-1)?.id).toBe(id);
    expect(made.weeklyTimes).toEqual([]);
    expect(await readPlanVersion(siteId, id, 1)).toMatchObject({ rules: made.rules });
  });

  it('may begin with nothing', async () => {
    await createPlan(ines, { name: 'Wedding', from: null });
    expect(await planNamed('Wedding')).toMatchObject({ rules: [], offers: null, version: 1 });
  });

  it('needs a name of its own, however it is written', async () => {
    expect(await refusal(createPlan(ines, { name: 'DINNER', from: null }))).toMatchObject({ code: 'conflict', details: { fields: [{ field: 'name' }] } });
  });

  it('does not begin with a plan of another site', async () => {
    expect((await refusal(createPlan(ines, { name: 'Bread', from: 'every-day' }))).code).toBe('not-found');
    expect((await plans()).map((plan) => plan.name)).not.toContain('Bread');
  });
});

describe('a name', () => {
  it('changes without making a version: what is live stays live', async () => {
    const before = await planNamed('Dinner');
    await renamePlan(ines, 'dinner', { name: 'Supper', was: 'Dinner' });
    expect(await planNamed('Supper')).toEqual({ ...before, name: 'Supper' });
  });

  it('is not changed on top of a change that was not seen', async () => {
    await renamePlan(ines, 'dinner', { name: 'Supper', was: 'Dinner' });
    expect(await refusal(renamePlan(ines, 'dinner', { name: 'Evening', was: 'Dinner' }))).toMatchObject({ code: 'stale', details: { current: { name: 'Supper' } } });
  });

  it('cannot be another plan\'s', async () => {
    expect((await refusal(renamePlan(ines, 'dinner', { name: 'lunch', was: 'Dinner' }))).code).toBe('conflict');
  });
});

describe('deleting', () => {
  it('takes a plan with all it had', async () => {
    const { id } = await createPlan(ines, { name: 'Sunday lunch', from: 'lunch' });
    await deletePlan(ines, id, 1);
    expect((await plans()).map((plan) => plan.id)).not.toContain(id);
    expect(await readPlanVersion(siteId, id, 1)).toBeNull();
  });

  it('leaves the live plan, and says why', async () => {
    const { version } = await planNamed('Dinner');
    const error = await refusal(deletePlan(ines, 'dinner', version));
    expect(error.message).toBe('This plan is live: the tills print by it. It was not deleted. Put another plan live first.');
  });

  it('leaves a plan that a weekly time would put live', async () => {
    const { version } = await planNamed('Lunch');
    expect((await refusal(deletePlan(ines, 'lunch', version))).message).toContain('7 times a week');
    await setWeeklyTimes(ines, 'lunch', { weeklyTimes: [], was: (await planNamed('Lunch')).weeklyTimes });
    await deletePlan(ines, 'lunch', version);
    expect((await plans()).map((plan) => plan.name)).not.toContain('Lunch');
  });

  it('leaves a plan that was changed since it was looked at', async () => {
    const { id } = await createPlan(ines, { name: 'Sunday lunch', from: 'lunch' });
    expect((await refusal(deletePlan(ines, id, 7))).code).toBe('stale');
  });
});

describe('the order of the tabs', () => {
  it('is kept', async () => {
    const turned = (await plans()).map((plan) => plan.id).toReversed();
    await orderPlans(ines, turned);
    expect((await plans()).map((plan) => plan.id)).toEqual(turned);
  });

  it.each([['one missing', (ids: readonly string[]) => ids.slice(1)], ['one twice', (ids: readonly string[]) => [...ids.slice(1), ids[1] ?? '']]])('is refused with %s', async (_what, change) => {
    const ids = (await plans()).map((plan) => plan.id);
    expect((await refusal(orderPlans(ines, change(ids)))).code).toBe('stale');
    expect((await plans()).map((plan) => plan.id)).toEqual(ids);
  });
});

describe('weekly times', () => {
  it('are set, one for each moment, and make no version', async () => {
    const before = await planNamed('Lunch');
    await setWeeklyTimes(ines, 'lunch', { weeklyTimes: [{ weekday: 7, start: '12:00' }, { weekday: 7, start: '12:00' }], was: before.weeklyTimes });
    expect(await planNamed('Lunch')).toEqual({ ...before, weeklyTimes: [{ weekday: 7, start: '12:00' }] });
  });

  it('cannot start two plans at one moment, and names the other', async () => {
    const { weeklyTimes } = await planNamed('Lunch');
    const error = await refusal(setWeeklyTimes(ines, 'lunch', { weeklyTimes: [{ weekday: 1, start: '17:00' }], was: weeklyTimes }));
    expect(error.message).toBe('Dinner starts at Monday 17:00 already. Nothing was changed. Choose another time, or remove that one from Dinner first.');
    expect((await planNamed('Lunch')).weeklyTimes).toEqual(weeklyTimes);
  });

  it('are not set on top of a change that was not seen', async () => {
    expect((await refusal(setWeeklyTimes(ines, 'lunch', { weeklyTimes: [], was: [] }))).code).toBe('stale');
  });
});

describe('who is on the board', () => {
  it('hears of the others, never of itself, and forgets who left', async () => {
    await ping(ines, 'dinner', 0);
    expect(await ping(femi, 'dinner', 10_000)).toEqual({ others: ['Ines Okafor'], newest: (await readPlan(ines, 'dinner')).version });
    expect((await ping(ines, 'dinner', 20_000)).others).toEqual(['Femi Lindqvist']);
    expect((await ping(ines, 'dinner', 60_000)).others).toEqual([]);
  });

  it('hears nothing from another plan', async () => {
    await ping(femi, 'lunch', 100_000);
    expect((await ping(ines, 'dinner', 100_000)).others).toEqual([]);
  });
});

describe('what is not for everybody', () => {
  const actions: readonly (readonly [string, (actor: Actor) => Promise<unknown>])[] = [
    ['make a plan', (actor) => createPlan(actor, { name: 'Sunday lunch', from: null })],
    ['rename one', (actor) => renamePlan(actor, 'lunch', { name: 'Noon', was: 'Lunch' })],
    ['delete one', (actor) => deletePlan(actor, 'lunch', 1)],
    ['order them', (actor) => orderPlans(actor, ['lunch'])],
    ['set weekly times', (actor) => setWeeklyTimes(actor, 'lunch', { weeklyTimes: [], was: [] })],
  ];

  it.each(actions)('an installer and a trainer cannot %s', async (_what, act) => {
    for (const role of ['installer', 'trainer'] as const) expect((await refusal(act({ ...femi, membership: membership(role) }))).code).toBe('not-allowed');
  });

  it.each(actions.slice(1, 3))('nobody can %s on another site', async (_what, act) => {
    expect((await refusal(act({ ...ines, siteId: 'pilgrims-oven' }))).code).toBe('not-found');
  });
});
