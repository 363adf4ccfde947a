import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { aPlan } from '@/tests/fixtures/build-site';
import { planChoices, planOfKey } from './plan-choices';

const dinner = aPlan([], { id: asId('dinner'), name: 'Dinner', version: 9 });
const lunch = aPlan([], { id: asId('lunch'), name: 'Lunch' });
const site = { plans: [lunch, dinner] };
const wordsFor = (livePlan: typeof dinner | null) => planChoices(site, livePlan).map(({ words }) => words);

describe('the plans an order can be tried under', () => {
  it('begin with what is live, apart from what has been edited since', () => {
    expect(wordsFor({ ...dinner, version: 7 })).toEqual(['Dinner, live', 'Lunch, not live', 'Dinner as edited, not live yet']);
  });

  it('name a plan once when its newest version is live', () => {
    expect(wordsFor(dinner)).toEqual(['Dinner, live', 'Lunch, not live']);
  });

  it('are all drafts when nothing is live', () => {
    expect(wordsFor(null)).toEqual(['Lunch, not live', 'Dinner, not live']);
  });

  it('are found again after the draft has gone live', () => {
    expect(planOfKey(planChoices(site, dinner), 'dinner')).toBe(dinner);
    expect(planOfKey(planChoices(site, { ...dinner, version: 7 }), 'dinner')).toBe(dinner);
    expect(planOfKey(planChoices(site, dinner), 'brunch')).toBeNull();
  });
});
