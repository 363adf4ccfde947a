import { asId, type SectionId, type StationId } from '@/lib/domain/site/ids';
import { anyCondition, type Plan, type PlanContent, type Rule, type WeeklyTime } from '@/lib/domain/site/plan';

const section = (key: string): SectionId => asId(`ly-s-${key}`);
const station = (key: string): StationId => asId(`ly-st-${key}`);

const allSections = ['from-the-grill', 'burgers', 'sunday-roast', 'salads', 'cold-starters', 'pasta', 'fish', 'sides', 'desserts', 'cocktails', 'wine-and-beer', 'hot-drinks', 'late-menu', 'oysters'];

const send = (plan: string, what: string, to: string): Rule => ({
  id: asId(`ly-r-${plan}-${what}`), kind: 'send', target: { kind: 'section', section: section(what) }, conditions: anyCondition, stations: [station(to)], keep: false,
});

const usual: readonly (readonly [string, string])[] = [
  ['from-the-grill', 'grill'], ['burgers', 'grill'], ['sunday-roast', 'grill'], ['salads', 'larder'], ['cold-starters', 'larder'], ['pasta', 'sauce'], ['fish', 'sauce'], ['sides', 'sauce'],
  ['desserts', 'pastry'], ['cocktails', 'bar'], ['wine-and-beer', 'bar'], ['hot-drinks', 'bar'],
];

const rulesOf = (plan: string, sends: readonly (readonly [string, string])[]): readonly Rule[] => [
  ...sends.map(([what, to]) => send(plan, what, to)),
  ...(sends.some(([what]) => what === 'burgers') ? [{
    id: asId<never>(`ly-r-${plan}-side-salad`), kind: 'split' as const, target: { kind: 'option' as const, option: asId<never>('ly-o-side-side-salad') }, conditions: anyCondition,
    stations: [station('larder')], keep: false,
  }] : []),
  { id: asId(`ly-r-${plan}-pass`), kind: 'copy', target: { kind: 'everything' }, conditions: anyCondition, stations: [station('pass')], keep: false },
];

const daily = (start: string): readonly WeeklyTime[] => [1, 2, 3, 4, 5, 6, 7].map((weekday) => ({ weekday, start }));
const without = (...left: readonly string[]): readonly SectionId[] => allSections.filter((key) => !left.includes(key)).map(section);
const only = (...kept: readonly string[]): readonly SectionId[] => kept.map(section);

const breakfastSends = [['hot-drinks', 'bar'], ['salads', 'larder'], ['desserts', 'pastry'], ['sides', 'sauce']] as const;
const quietSends = [['late-menu', 'larder'], ['oysters', 'larder'], ['salads', 'larder'], ['desserts', 'larder'], ['cocktails', 'bar'], ['wine-and-beer', 'bar'], ['hot-drinks', 'bar']] as const;

/** The version of Dinner that the tills are set to. Everything in it prints. */
export const liveVersion = 12;

const atLive: PlanContent = {
  offers: without('late-menu', 'oysters'),
  rules: rulesOf('dinner', usual.map(([what, to]) => [what, what === 'sunday-roast' ? 'sauce' : to] as const)),
};
const roastMoved: PlanContent = { offers: atLive.offers, rules: rulesOf('dinner', usual) };
const lateOffered: PlanContent = { offers: without('oysters'), rules: roastMoved.rules };
const oystersOffered: PlanContent = { offers: null, rules: roastMoved.rules };

/** Dinner as it was edited, up to what the board shows: two sections were offered and nobody has sent them anywhere. */
export const dinnerHistory: readonly { readonly number: number; readonly content: PlanContent; readonly summary: string }[] = [
  { number: liveVersion, content: atLive, summary: 'Sunday roast to Sauce' },
  { number: liveVersion + 1, content: roastMoved, summary: 'Sunday roast to Grill' },
  { number: liveVersion + 2, content: lateOffered, summary: 'Late menu is offered' },
  { number: liveVersion + 3, content: oystersOffered, summary: 'Oysters is offered' },
];

const plan = (key: string, name: string, position: number, version: number, weeklyTimes: readonly WeeklyTime[], content: PlanContent): Plan =>
  ({ id: asId(`ly-plan-${key}`), name, position, version, weeklyTimes, ...content });

export const lanternYardPlans: readonly Plan[] = [
  plan('breakfast', 'Breakfast', 0, 3, daily('07:00'), { offers: only('hot-drinks', 'salads', 'desserts', 'sides'), rules: rulesOf('breakfast', breakfastSends) }),
  plan('lunch', 'Lunch', 1, 5, daily('11:30'), { offers: without('late-menu', 'oysters', 'sunday-roast'), rules: rulesOf('lunch', usual.filter(([what]) => what !== 'sunday-roast')) }),
  plan('dinner', 'Dinner', 2, liveVersion + 3, daily('17:00'), oystersOffered),
  plan('quiet', 'Quiet night', 3, 4, daily('22:00'), { offers: only('late-menu', 'oysters', 'salads', 'desserts', 'cocktails', 'wine-and-beer', 'hot-drinks'), rules: rulesOf('quiet', quietSends) }),
];
