import type { AreaId, ItemId, OptionId, PlanId, RuleId, SectionId, StationId, TillId } from './ids';
import type { OrderType } from './order-types';

export const ruleKinds = ['send', 'split', 'copy'] as const;
export type RuleKind = (typeof ruleKinds)[number];

/**
 * What a rule is about. `send` takes everything, a section or an item; `split` an option, on its own or
 * narrowed to a section or an item; `copy` any of them.
 */
export type Target =
  | { readonly kind: 'everything' }
  | { readonly kind: 'section'; readonly section: SectionId }
  | { readonly kind: 'item'; readonly item: ItemId }
  | { readonly kind: 'option'; readonly option: OptionId }
  | { readonly kind: 'option-on-section'; readonly option: OptionId; readonly section: SectionId }
  | { readonly kind: 'option-on-item'; readonly option: OptionId; readonly item: ItemId };

/** Each set empty means "any". */
export type Conditions = {
  readonly orderTypes: readonly OrderType[];
  readonly areas: readonly AreaId[];
  readonly tills: readonly TillId[];
};

export const anyCondition: Conditions = { orderTypes: [], areas: [], tills: [] };

export type Rule = {
  readonly id: RuleId;
  readonly kind: RuleKind;
  readonly target: Target;
  readonly conditions: Conditions;
  /** At least one. */
  readonly stations: readonly StationId[];
  /** For `split`: the dish's own ticket shows the option too. */
  readonly keep: boolean;
};

/** A service starts weekly at a wall-clock time in the site's zone. */
export type WeeklyTime = {
  /** ISO weekday, 1 Monday to 7 Sunday. */
  readonly weekday: number;
  /** "HH:MM". */
  readonly start: string;
};

/** What a person edits on the board; a later rule stands below an earlier one. */
export type PlanContent = {
  /** The menu sections this plan offers; null means all of them. */
  readonly offers: readonly SectionId[] | null;
  readonly rules: readonly Rule[];
};

/** One complete set of rules, made for one service. */
export type Plan = PlanContent & {
  readonly id: PlanId;
  readonly name: string;
  readonly position: number;
  /** Every edit makes the next version. */
  readonly version: number;
  readonly weeklyTimes: readonly WeeklyTime[];
};
