import { describe, expect, it } from 'vitest';
import { siteOf } from '@/seeders/demo-site';
import { lanternYard as demo } from '@/seeders/lantern-yard/lantern-yard';
import { viewProof } from './proof-view';

const lanternYard = siteOf(demo, '2026-11-24T10:30:00.000Z');
const dinner = lanternYard.plans.find((plan) => plan.name === 'Dinner')!;

describe('the proof page of the demo', () => {
  const view = viewProof(lanternYard, dinner, null);

  it('says the verdict and how much was tried', () => {
    expect(view.plan.verdict).toBe('10 items would print nowhere');
    expect(view.tried).toContain('3,705 ways to order: 182 items and 65 options, from 5 tills, in 3 order types');
  });

  it('counts each item of a section at the station that cooks it', () => {
    const burgers = view.coverage.find((row) => row.section === 'Burgers')!;
    expect(burgers.cooked[view.stations.indexOf('Grill')]).toBe(burgers.items);
    expect(view.coverage.reduce((sum, row) => sum + row.items, 0)).toBe(182);
    expect(view.coverage.filter((row) => row.lost > 0).map((row) => [row.section, row.lost])).toEqual([['Late menu', 6], ['Oysters', 4]]);
  });

  it('puts what loses most first in the drill, and proposes what would close the gap', () => {
    expect(view.single.slice(0, 1).map((row) => row.lost)[0]).toBeGreaterThan(0);
    const bar = view.single.find((row) => row.name === 'BAR1')!;
    expect(bar).toMatchObject({ lost: 61, tills: ['Till 1', 'Till 2', 'Till 3', 'Counter'] });
    expect(bar.proposal?.fix).toMatchObject({ kind: 'set-backup', printer: 'bar1' });
  });

  it('says what now differs from the plan', () => {
    const closed = { ...lanternYard, stations: lanternYard.stations.map((station) => (station.name === 'Larder' ? { ...station, open: false } : station)) };
    const now = viewProof(closed, dinner, null);
    expect(now.unusual).toEqual(['Larder is closed.']);
    expect(now.now.lost).toBeGreaterThan(now.plan.lost);
  });

  it('compares with what is live in sentences', () => {
    const live = { ...dinner, version: 1, rules: dinner.rules.filter((rule) => rule.target.kind !== 'section' || rule.target.section !== 'desserts') };
    expect(viewProof(lanternYard, dinner, live).changes?.[0]?.words).toContain('Desserts');
    expect(viewProof(lanternYard, dinner, dinner).changes).toBeNull();
  });
});
