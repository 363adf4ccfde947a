import { beforeEach, describe, expect, it } from 'vitest';
import { changePlanBody } from '@/features/board/schema';
import { changePlan } from '@/features/board/server/change-plan';
import { readPlan } from '@/features/board/server/read-plan';
import { readSite } from '@/features/board/server/read-site';
import { viewBoard } from '@/features/board/server/view-board';
import { applyEdit } from '@/lib/domain/plans/apply-edit';
import type { PlanEdit } from '@/lib/domain/plans/edit';
import type { Role } from '@/lib/domain/roles/permissions';
import { asId, type RuleId } from '@/lib/domain/site/ids';
import { anyCondition, type PlanContent } from '@/lib/domain/site/plan';
import { AppError } from '@/lib/http/errors';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { readPlanVersion } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { seedDatabase } from '@/tests/setup/demo-database';
import { counting } from '@/tests/fixtures/small-plan-site';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const membership = (role: Role): Actor['membership'] => ({ role, mayOverride: false, title: '' });
const ines: Actor = { person: { id: 'ines-okafor', name: 'Ines Okafor', email: '' }, membership: membership('chef'), siteId };
const marguerite: Actor = { person: { id: 'marguerite-adeyemi', name: 'Marguerite Adeyemi', email: '' }, membership: membership('owner'), siteId };

const oystersToLarder: PlanEdit = { kind: 'send', targets: [{ kind: 'section', section: asId('oysters') }], conditions: anyCondition, how: 'replace', stations: [asId('larder')] };
const after = (content: PlanContent, edit: PlanEdit): PlanContent => applyEdit(content, edit, counting());
const refusal = async (work: Promise<unknown>): Promise<AppError> => {
  const error: unknown = await work.then(() => null, (thrown: unknown) => thrown);
  if (!(error instanceof AppError)) throw new Error(`Expected a refusal, got ${String(error)}`);
  return error;
};

describe('saving a plan', () => {
  it('makes the next version, keeps the one before, and writes who did what', async () => {
    const before = await readPlan(ines, 'dinner');
    const content = after(before.content, oystersToLarder);
    const { version } = await changePlan(ines, { planId: 'dinner', version: before.version, content, summary: 'Oysters to Larder' });
    expect(version).toBe(before.version + 1);
    expect(await readPlan(ines, 'dinner')).toMatchObject({ version, content, changedBy: 'Ines Okafor', byYou: true });
    expect(await readPlanVersion(siteId, 'dinner', before.version)).toEqual(before.content);
    expect(await lastChangeOf(siteId, 'plan', 'dinner')).toMatchObject({ by: 'Ines Okafor', summary: 'Dinner: Oysters to Larder' });
  });

  it('comes back from the tables exactly as it was sent, conditions, order and all', async () => {
    const before = await readPlan(ines, 'lunch');
    const edits: readonly PlanEdit[] = [
      { kind: 'send', targets: [{ kind: 'section', section: asId('fish') }], conditions: { orderTypes: ['take-away'], areas: [asId('terrace')], tills: [asId('till-1')] }, how: 'replace', stations: [asId('sauce'), asId('grill')] },
      { kind: 'offer', sections: [asId('pasta')], offered: false, all: (await readSite(ines)).site.menu.sections.map((section) => section.id) },
    ];
    const newId = counting();
    const content = edits.reduce((standing, edit) => applyEdit(standing, edit, newId), before.content);
    await changePlan(ines, { planId: 'lunch', version: before.version, content, summary: 'Two changes' });
    const site = await loadSite(siteId);
    const lunch = site?.plans.find((plan) => plan.id === 'lunch');
    expect(lunch?.rules).toEqual(content.rules);
    expect(lunch?.offers?.toSorted()).toEqual(content.offers?.toSorted());
  });

  it('refuses a stale one with what is there now and who made it, and writes nothing', async () => {
    const before = await readPlan(ines, 'dinner');
    const theirs = after(before.content, oystersToLarder);
    await changePlan(marguerite, { planId: 'dinner', version: before.version, content: theirs, summary: 'Oysters to Larder' });
    const error = await refusal(changePlan(ines, { planId: 'dinner', version: before.version, content: before.content, summary: 'Late menu to Grill' }));
    expect(error.code).toBe('stale');
    expect(error.message).toContain('Marguerite Adeyemi changed this plan while you did. Yours was not saved.');
    expect(error.details.current).toMatchObject({ version: before.version + 1, content: theirs, changedBy: 'Marguerite Adeyemi', byYou: false });
    expect(error.details.changed).toMatchObject({ by: 'Marguerite Adeyemi', summary: 'Dinner: Oysters to Larder' });
    expect((await readPlan(ines, 'dinner')).version).toBe(before.version + 1);
  });

  it('of two people who save at once, lets one through and tells the other', async () => {
    const before = await readPlan(ines, 'dinner');
    const save = (actor: Actor): Promise<unknown> => changePlan(actor, { planId: 'dinner', version: before.version, content: before.content, summary: 'The same moment' });
    const outcomes = await Promise.allSettled([save(ines), save(marguerite)]);
    const told = outcomes.flatMap((outcome) => (outcome.status === 'rejected' ? [(outcome.reason as AppError).code] : []));
    expect(told).toEqual(['stale']);
  });

  const dinner = { kind: 'section', section: asId<never>('oysters') } as const;
  it.each<readonly [string, (id: RuleId) => PlanContent['rules'][number], string]>([
    ['a station that has gone', (id) => ({ id, kind: 'send', target: dinner, conditions: anyCondition, stations: [asId('gone')], keep: false }), 'This rule names a station that is not on this site any more.'],
    ['a station of another site', (id) => ({ id, kind: 'send', target: dinner, conditions: anyCondition, stations: [asId('oven')], keep: false }), 'This rule names a station that is not on this site any more.'],
    ['a pass that should cook', (id) => ({ id, kind: 'send', target: dinner, conditions: anyCondition, stations: [asId('pass')], keep: false }), 'This rule sends dishes to a pass, which cooks nothing; a pass gets copies.'],
    ['an item that has gone', (id) => ({ id, kind: 'send', target: { kind: 'item', item: asId('gone') }, conditions: anyCondition, stations: [asId('larder')], keep: false }), 'This rule names an item that is not on this site any more.'],
    ['a till that has gone', (id) => ({ id, kind: 'send', target: dinner, conditions: { ...anyCondition, tills: [asId('gone')] }, stations: [asId('larder')], keep: false }), 'This rule names a till that is not on this site any more.'],
  ])('refuses %s, names the rule, and writes nothing', async (_what, make, reason) => {
    const before = await readPlan(ines, 'dinner');
    const rules = [...before.content.rules, make(asId('one-more'))];
    const error = await refusal(changePlan(ines, { planId: 'dinner', version: before.version, content: { ...before.content, rules }, summary: 'One more' }));
    expect(error.code).toBe('invalid');
    expect(error.details.fields).toEqual([{ field: `content.rules.${rules.length - 1}`, reason }]);
    expect(await readPlan(ines, 'dinner')).toEqual(before);
  });

  it.each<Role>(['installer', 'trainer'])('is not for %ss, who may read', async (role) => {
    const actor: Actor = { ...ines, membership: membership(role) };
    const before = await readPlan(actor, 'dinner');
    const error = await refusal(changePlan(actor, { planId: 'dinner', version: before.version, content: before.content, summary: 'Anything' }));
    expect(error.code).toBe('not-allowed');
    expect((await readPlan(actor, 'dinner')).version).toBe(before.version);
  });

  it('does not reach a plan of another site', async () => {
    const elsewhere: Actor = { ...ines, siteId: 'pilgrims-oven' };
    const before = await readPlan(ines, 'dinner');
    expect((await refusal(readPlan(elsewhere, 'dinner'))).code).toBe('not-found');
    expect((await refusal(changePlan(elsewhere, { planId: 'dinner', version: before.version, content: before.content, summary: 'Anything' }))).code).toBe('not-found');
    expect(await readPlan(ines, 'dinner')).toEqual(before);
  });
});

describe('what the schema takes', () => {
  const rule = { id: 'r1', kind: 'send', target: { kind: 'everything' }, conditions: { orderTypes: [], areas: [], tills: [] }, stations: ['grill'], keep: false };
  const takes = (change: object): boolean => changePlanBody.safeParse({ summary: 'One', content: { offers: null, rules: [{ ...rule, ...change }] } }).success;

  it.each<readonly [string, object, boolean]>([
    ['a send rule', {}, true],
    ['a copy of an option', { kind: 'copy', target: { kind: 'option', option: 'side-salad' } }, true],
    ['a split of an option that keeps', { kind: 'split', target: { kind: 'option', option: 'side-salad' }, keep: true }, true],
    ['a rule without a station', { stations: [] }, false],
    ['a split of a section', { kind: 'split', target: { kind: 'section', section: 'burgers' } }, false],
    ['a send rule about an option', { target: { kind: 'option', option: 'side-salad' } }, false],
    ['an order type that is none', { conditions: { orderTypes: ['dine'], areas: [], tills: [] } }, false],
    ['a field nobody asked for', { colour: 'red' }, false],
  ])('%s', (_what, change, expected) => {
    expect(takes(change)).toBe(expected);
  });
});

describe('the board that opens', () => {
  it('shows the newest content, what of it is not live, and the tray that the proof finds lost', async () => {
    const site = await loadSite(siteId);
    const plan = site?.plans.find((one) => one.id === 'dinner');
    if (site === null || plan === undefined) throw new Error('The demo has no Dinner.');
    const view = await viewBoard({ site, membership: membership('chef') }, plan);
    expect(view.mayWrite).toBe(true);
    expect(view.mayFix).not.toContain('rename-printer');
    expect(view.proof.lostItems).toBe(10);
    expect(view.liveContent).toEqual(await readPlanVersion(siteId, 'dinner', site.live?.version ?? 0));
    const bar = view.stations.find((station) => station.name === 'Bar');
    expect(bar?.plates.map((plate) => `${plate.name}: ${plate.quiet}`)).toEqual(['BAR1: No backup', 'BAR2: First for Terrace']);
  });
});
