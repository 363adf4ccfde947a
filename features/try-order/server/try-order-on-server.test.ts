import { beforeEach, describe, expect, it, vi } from 'vitest';
import { readyOrders } from '@/lib/domain/orders/ready-orders';
import { tryOrder } from '@/lib/domain/orders/try-order';
import { asId } from '@/lib/domain/site/ids';
import { allWell, presentOf } from '@/lib/domain/site/present';
import type { Actor } from '@/lib/server/actor';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { liveKey } from '../plan-choices';
import { presentChoices, tryOrderInput } from '../schema';
import { tryOrderOnServer } from './try-order-on-server';

const { loadSite, readPlanVersion } = vi.hoisted(() => ({ loadSite: vi.fn(), readPlanVersion: vi.fn() }));
vi.mock('@/lib/server/site-snapshot', () => ({ loadSite }));
vi.mock('@/lib/server/plan-store', () => ({ readPlanVersion }));
vi.mock('@/lib/server/database', () => ({}));

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('till', 'room', '10.20.30.11')],
  stations: [aStation('Grill', ['GRILL1']), aStation('Larder', ['LARDER1'], { open: false })],
  printers: [aPrinter('GRILL1', '10.20.30.201'), aPrinter('LARDER1', '10.20.30.202')],
  menu: { sections: [aSection('Burgers'), aSection('Salads')], items: [anItem('Burger', 'Burgers'), anItem('Beetroot', 'Salads')] },
  plans: [aPlan([
    aRule('burgers', 'send', { kind: 'section', section: asId('Burgers') }, ['Grill']),
    aRule('salads', 'send', { kind: 'section', section: asId('Salads') }, ['Larder']),
  ])],
});
const plan = site.plans[0]!;
const actor: Actor = { person: { id: 'p', name: 'Ana', email: '' }, membership: { role: 'trainer', mayOverride: false, title: '' }, siteId: site.id };

beforeEach(() => loadSite.mockResolvedValue(site));

describe('an order tried on the server', () => {
  it.each(presentChoices)('comes out as in the browser, %s', async (present) => {
    for (const { order } of readyOrders(site, plan)) {
      const sent = tryOrderInput.parse(JSON.parse(JSON.stringify({ plan: plan.id, present, order, time: '19:42' })));
      expect(await tryOrderOnServer({ ...actor, ...sent })).toEqual(tryOrder(site, plan, present === 'now' ? presentOf(site) : allWell, order, { time: '19:42' }));
    }
  });

  it('sees a closed station only when asked for the kitchen as it is now', async () => {
    const { order } = readyOrders(site, plan).find(({ key }) => key === 'every-section')!;
    const outcomes = async (present: 'planned' | 'now') => (await tryOrderOnServer({ ...actor, plan: plan.id, present, order, time: '19:42' })).lines.map(({ outcome }) => outcome);
    expect(await outcomes('planned')).toEqual(['prints', 'prints']);
    expect(await outcomes('now')).toEqual(['prints', 'lost']);
  });

  it('goes by the version that is live, not by what has been edited since', async () => {
    loadSite.mockResolvedValue({ ...site, live: { planId: plan.id, version: 0, since: '', inForceOn: [] } });
    readPlanVersion.mockResolvedValue({ offers: null, rules: [] });
    const { order } = readyOrders(site, plan)[0]!;
    const live = await tryOrderOnServer({ ...actor, plan: liveKey, present: 'planned', order, time: '19:42' });
    expect(readPlanVersion).toHaveBeenCalledWith(site.id, plan.id, 0);
    expect(new Set(live.lines.map(({ outcome }) => outcome))).toEqual(new Set(['lost']));
  });

  it('is refused in words when its plan has gone', async () => {
    const { order } = readyOrders(site, plan)[0]!;
    await expect(tryOrderOnServer({ ...actor, plan: 'gone', present: 'planned', order, time: '19:42' })).rejects.toThrow('This plan is not there any more');
  });

  it.each([['a time that is none', { time: '25:00' }], ['an unknown order type', { order: { orderType: 'by pigeon' } }]])('does not take %s', (_, fault) => {
    const { order } = readyOrders(site, plan)[0]!;
    const fine = { plan: plan.id, present: 'planned', order, time: '19:42' };
    expect(tryOrderInput.safeParse(fine).success).toBe(true);
    expect(tryOrderInput.safeParse({ ...fine, ...fault, order: { ...order, ...('order' in fault ? fault.order : {}) } }).success).toBe(false);
  });
});
