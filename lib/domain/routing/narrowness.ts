import type { Rule, Target } from '@/lib/domain/site/plan';

/** What told two rules apart, in the order they are compared; `later` is the tie that the plan's order settles. */
export const dimensions = ['target', 'till', 'area', 'orderType', 'later'] as const;
export type Dimension = (typeof dimensions)[number];

const targetLevels: Readonly<Record<Target['kind'], number>> = {
  everything: 0,
  option: 0,
  section: 1,
  'option-on-section': 1,
  item: 2,
  'option-on-item': 2,
};

/**
 * How narrow a rule is, as one number that compares target first, then till named, area named, order type
 * named. How many are named never counts. Range 0 to 23; equal numbers are a tie.
 */
export const narrownessOf = (rule: Rule): number =>
  targetLevels[rule.target.kind] * 8
  + (rule.conditions.tills.length > 0 ? 4 : 0)
  + (rule.conditions.areas.length > 0 ? 2 : 0)
  + (rule.conditions.orderTypes.length > 0 ? 1 : 0);

/** The first dimension in which `winner` is narrower than `loser`, or `later` when they tie. */
export const decidedBy = (winner: Rule, loser: Rule): Dimension => {
  const difference = narrownessOf(winner) ^ narrownessOf(loser);
  if (difference >= 8) return 'target';
  if (difference >= 4) return 'till';
  if (difference >= 2) return 'area';
  return difference === 1 ? 'orderType' : 'later';
};
