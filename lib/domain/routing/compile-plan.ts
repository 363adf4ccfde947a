import type { AreaId, ItemId, OptionId, SectionId, StationId, TillId } from '@/lib/domain/site/ids';
import type { OrderType } from '@/lib/domain/site/order-types';
import type { PlanContent, Rule } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { narrownessOf } from './narrowness';

/** Where and how a line is ordered. */
export type Context = { readonly orderType: OrderType; readonly area: AreaId; readonly till: TillId };

/** A rule with its conditions as sets (null: any) and its place in the plan. */
export type CompiledRule = {
  readonly rule: Rule;
  readonly narrowness: number;
  readonly position: number;
  readonly stations: readonly StationId[];
  readonly orderTypes: ReadonlySet<OrderType> | null;
  readonly areas: ReadonlySet<AreaId> | null;
  readonly tills: ReadonlySet<TillId> | null;
};

/** Rules for one target, the one that would win first. */
type Ranked = readonly CompiledRule[];

/** A plan's rules indexed by what they are about, so that a line looks only at rules that cover it. */
export type CompiledPlan = {
  readonly offers: ReadonlySet<SectionId> | null;
  readonly sectionOf: ReadonlyMap<ItemId, SectionId>;
  readonly sendOnItem: ReadonlyMap<ItemId, Ranked>;
  readonly sendOnSection: ReadonlyMap<SectionId, Ranked>;
  readonly sendEverything: Ranked;
  readonly splitOnItem: ReadonlyMap<OptionId, ReadonlyMap<ItemId, Ranked>>;
  readonly splitOnSection: ReadonlyMap<OptionId, ReadonlyMap<SectionId, Ranked>>;
  readonly splitBare: ReadonlyMap<OptionId, Ranked>;
  readonly copies: readonly CompiledRule[];
};

const setOrAny = <Value>(values: readonly Value[]): ReadonlySet<Value> | null =>
  values.length === 0 ? null : new Set(values);

const compileRule = (rule: Rule, position: number): CompiledRule => ({
  rule,
  narrowness: narrownessOf(rule),
  position,
  stations: rule.stations,
  orderTypes: setOrAny(rule.conditions.orderTypes),
  areas: setOrAny(rule.conditions.areas),
  tills: setOrAny(rule.conditions.tills),
});

/** Narrower first; of equals the later in the plan. */
const winningFirst = (left: CompiledRule, right: CompiledRule): number =>
  right.narrowness - left.narrowness || right.position - left.position;

const entry = <Key, Value>(map: Map<Key, Value>, key: Key, make: () => Value): Value => {
  const present = map.get(key);
  if (present !== undefined) return present;
  const made = make();
  map.set(key, made);
  return made;
};

export const holds = (rule: CompiledRule, context: Context): boolean =>
  (rule.orderTypes === null || rule.orderTypes.has(context.orderType))
  && (rule.areas === null || rule.areas.has(context.area))
  && (rule.tills === null || rule.tills.has(context.till));

/** Reads a plan once, so that each line afterwards costs a look-up instead of a walk over all rules. */
export const compilePlan = (site: Pick<Site, 'menu'>, plan: PlanContent): CompiledPlan => {
  const sendOnItem = new Map<ItemId, CompiledRule[]>();
  const sendOnSection = new Map<SectionId, CompiledRule[]>();
  const sendEverything: CompiledRule[] = [];
  const splitOnItem = new Map<OptionId, Map<ItemId, CompiledRule[]>>();
  const splitOnSection = new Map<OptionId, Map<SectionId, CompiledRule[]>>();
  const splitBare = new Map<OptionId, CompiledRule[]>();
  const copies: CompiledRule[] = [];
  const none = (): CompiledRule[] => [];

  const listFor = (rule: Rule): CompiledRule[] => {
    const { target } = rule;
    if (rule.kind === 'copy') return copies;
    switch (target.kind) {
      case 'everything': return sendEverything;
      case 'section': return entry(sendOnSection, target.section, none);
      case 'item': return entry(sendOnItem, target.item, none);
      case 'option': return entry(splitBare, target.option, none);
      case 'option-on-section': return entry(entry(splitOnSection, target.option, () => new Map()), target.section, none);
      case 'option-on-item': return entry(entry(splitOnItem, target.option, () => new Map()), target.item, none);
    }
  };
  plan.rules.forEach((rule, position) => listFor(rule).push(compileRule(rule, position)));

  const lists = [
    sendEverything,
    ...sendOnItem.values(), ...sendOnSection.values(), ...splitBare.values(),
    ...[...splitOnItem.values(), ...splitOnSection.values()].flatMap((byTarget) => [...byTarget.values()]),
  ];
  for (const list of lists) list.sort(winningFirst);

  return {
    offers: plan.offers === null ? null : new Set(plan.offers),
    sectionOf: new Map(site.menu.items.map((item) => [item.id, item.section])),
    sendOnItem, sendOnSection, sendEverything, splitOnItem, splitOnSection, splitBare, copies,
  };
};
