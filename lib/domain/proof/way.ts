import type { ItemId, OptionId, StationId, TillId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { Rule } from '@/lib/domain/site/plan';

/** One line the proof tries: an item with up to two options, ordered in one way from one till. */
export type Way = {
  readonly item: ItemId;
  readonly options: readonly OptionId[];
  readonly orderType: OrderType;
  readonly till: TillId;
};

/** Stations asked for together. The same list is one value, so that two asks compare by their number. */
export type Ask = { readonly number: number; readonly stations: readonly StationId[] };

/** Ways that ask the same stations from the same till: whatever breaks, they meet the same fate. */
export type WayClass = {
  /** Its place in `Ways.classes`. */
  readonly number: number;
  readonly till: TillId;
  /** Empty when no rule sends the dish anywhere. */
  readonly cook: Ask;
  readonly splits: readonly Ask[];
  readonly copies: Ask;
  /** The first such way met, for the example in a finding. */
  readonly first: Way;
  readonly items: readonly ItemId[];
  readonly ways: number;
};

/** What became of one rule over everything its target and conditions cover. */
export type RuleUse = {
  readonly rule: Rule;
  readonly won: number;
  readonly beatenByNarrower: number;
  readonly beatenByEqual: number;
};

/** Two rules that only the plan's order told apart. */
export type Tie = { readonly winner: Rule; readonly loser: Rule; readonly way: Way };

/** Everything that could be ordered under one plan, folded into classes. */
export type Ways = {
  readonly total: number;
  readonly items: number;
  /** Item and option together, each counted once. */
  readonly optionChoices: number;
  readonly tills: number;
  readonly orderTypes: number;
  readonly classes: readonly WayClass[];
  /** For each way in the order they were tried (item, option set, till, order type) the number of its class. */
  readonly classOfWay: readonly number[];
  readonly uses: readonly RuleUse[];
  readonly ties: readonly Tie[];
};
