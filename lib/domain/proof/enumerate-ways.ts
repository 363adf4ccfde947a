import { compilePlan, holds, type CompiledPlan, type CompiledRule, type Context } from '@/lib/domain/routing/compile-plan';
import type { ItemId, OptionId, SectionId, StationId } from '@/lib/domain/site/ids';
import type { Item } from '@/lib/domain/site/menu';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { Divert } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { optionSetsOf } from './option-sets';
import { countRuleUses, type RuleScore } from './rule-uses';
import type { Ask, Way, WayClass, Ways } from './way';

type OpenClass = { -readonly [Key in keyof WayClass]: WayClass[Key] } & { items: ItemId[]; readonly number: number };
type Ranked = readonly CompiledRule[];

const noRules: Ranked = [];
const noStations: readonly StationId[] = [];

/** Gives each distinct list of stations one number. */
const numberAsks = () => {
  const byKey = new Map<string, Ask>();
  const byList = new Map<readonly StationId[], Ask>();
  return (stations: readonly StationId[]): Ask => {
    const known = byList.get(stations);
    if (known !== undefined) return known;
    const key = stations.join('\n');
    const ask = byKey.get(key) ?? { number: byKey.size, stations };
    byKey.set(key, ask);
    byList.set(stations, ask);
    return ask;
  };
};

type Askers = {
  /** For each context, the stations that cook the item. */
  readonly cook: (item: Item) => readonly Ask[];
  /** For each context, the stations that an option splits to; null where it stays with its dish. */
  readonly split: (item: Item, option: OptionId) => readonly (Ask | null)[] | null;
  readonly copies: (item: Item, options: readonly OptionId[]) => readonly Ask[];
};

const remembered = <Key, Value>(memory: Map<Key, Value>, key: Key, make: () => Value): Value => {
  const known = memory.get(key);
  if (known !== undefined) return known;
  const made = make();
  memory.set(key, made);
  return made;
};

const prepareAskers = (plan: CompiledPlan, contexts: readonly Context[], diverts: readonly Divert[], score: RuleScore): Askers => {
  const ask = numberAsks();
  const itemDiverts = new Map(diverts.flatMap((divert) => (divert.kind === 'item' ? [[divert.item, divert.to] as const] : [])));
  const sectionDiverts = new Map(diverts.flatMap((divert) => (divert.kind === 'section' ? [[divert.section, divert.to] as const] : [])));
  const bySection = new Map<SectionId, readonly Ask[]>();
  const splitBySection = new Map<OptionId, Map<SectionId, readonly (Ask | null)[]>>();
  const copiesBySection = new Map<SectionId, readonly Ask[]>();
  const itemsWithCopies = new Set(plan.copies.flatMap(({ rule }) => (rule.target.kind === 'item' || rule.target.kind === 'option-on-item' ? [rule.target.item] : [])));
  const copyOptions = new Set(plan.copies.flatMap(({ rule }) => ('option' in rule.target ? [rule.target.option] : [])));
  const wayOf = (item: Item, options: readonly OptionId[]) => (index: number): Way => {
    const context = contexts[index]!;
    return { item: item.id, options, orderType: context.orderType, till: context.till };
  };

  const cookOf = (item: Item, ownRules: Ranked): readonly Ask[] => {
    const lists = [ownRules, plan.sendOnSection.get(item.section) ?? noRules, plan.sendEverything];
    const diverted = itemDiverts.get(item.id) ?? sectionDiverts.get(item.section);
    return score.winnersAmong(lists, wayOf(item, [])).map((winner) => ask(diverted ?? winner?.stations ?? noStations));
  };

  const splitOf = (item: Item, option: OptionId, ownRules: Ranked): readonly (Ask | null)[] => {
    const lists = [ownRules, plan.splitOnSection.get(option)?.get(item.section) ?? noRules, plan.splitBare.get(option) ?? noRules];
    return score.winnersAmong(lists, wayOf(item, [option])).map((winner) => (winner === null ? null : ask(winner.stations)));
  };

  const coversCopy = (rule: CompiledRule, item: Item, options: readonly OptionId[]): boolean => {
    const { target } = rule.rule;
    if ('option' in target && !options.includes(target.option)) return false;
    if ('section' in target && target.section !== item.section) return false;
    return !('item' in target) || target.item === item.id;
  };

  const copiesOf = (item: Item, options: readonly OptionId[]): readonly Ask[] => {
    const covering = plan.copies.filter((rule) => coversCopy(rule, item, options));
    if (covering.length === 0) return contexts.map(() => ask(noStations));
    return contexts.map((context) => {
      const holding = covering.filter((rule) => holds(rule, context));
      for (const rule of holding) score.noteCopy(rule);
      const [only] = holding;
      return ask(holding.length === 1 && only !== undefined ? only.stations : [...new Set(holding.flatMap((rule) => rule.stations))]);
    });
  };

  return {
    cook: (item) => {
      const own = plan.sendOnItem.get(item.id);
      if (own !== undefined || itemDiverts.has(item.id)) return cookOf(item, own ?? noRules);
      return remembered(bySection, item.section, () => cookOf(item, noRules));
    },
    split: (item, option) => {
      const own = plan.splitOnItem.get(option)?.get(item.id);
      if (own !== undefined) return splitOf(item, option, own);
      if (plan.splitBare.get(option) === undefined && plan.splitOnSection.get(option)?.get(item.section) === undefined) return null;
      const memory = remembered(splitBySection, option, () => new Map<SectionId, readonly (Ask | null)[]>());
      return remembered(memory, item.section, () => splitOf(item, option, noRules));
    },
    copies: (item, options) => {
      if (itemsWithCopies.has(item.id) || options.some((option) => copyOptions.has(option))) return copiesOf(item, options);
      return remembered(copiesBySection, item.section, () => copiesOf(item, []));
    },
  };
};

const contextsOf = (site: Site): readonly Context[] =>
  site.tills.flatMap((till) => till.orderTypes.map((orderType) => ({ orderType, area: till.area, till: till.id })));

const splitOptionsOf = (plan: CompiledPlan): ReadonlySet<OptionId> =>
  new Set([...plan.splitBare.keys(), ...plan.splitOnSection.keys(), ...plan.splitOnItem.keys()]);

/** Items that a plan's proof tries: offered, and meant to print. */
export const triedItems = (site: Pick<Site, 'menu'>, plan: PlanContent): readonly Item[] => {
  const offers = plan.offers === null ? null : new Set(plan.offers);
  return site.menu.items.filter((item) => !item.noTicket && (offers === null || offers.has(item.section)));
};

/** More than the distinct station lists of any plan; four such numbers still fit a double exactly. */
const stride = 8192;

/**
 * Tries every way to order under a plan and folds those that must meet the same fate into classes.
 *
 * @param diverts section and item diverts in force; station and printer diverts are judged later
 * @param compiled the same plan, when the caller has read it already
 * @returns classes in a fixed order: same site and plan, same result
 */
export const enumerateWays = (site: Site, plan: PlanContent, diverts: readonly Divert[] = [], compiled: CompiledPlan = compilePlan(site, plan)): Ways => {
  const contexts = contextsOf(site);
  const items = triedItems(site, plan);
  const score = countRuleUses(plan.rules, contexts);
  const askers = prepareAskers(compiled, contexts, diverts, score);
  const optionSets = optionSetsOf(site.menu, splitOptionsOf(compiled));
  const tillNumbers = new Map(site.tills.map((till, index) => [till.id, index]));
  const tillOf = contexts.map((context) => tillNumbers.get(context.till) ?? 0);
  const classes: OpenClass[] = [];
  const classesOfTill = site.tills.map(() => new Map<number, OpenClass>());
  const classOfWay: number[] = [];
  let total = 0;
  let optionChoices = 0;

  for (const item of items) {
    const cooks = askers.cook(item);
    for (const options of optionSets(item)) {
      if (options.length === 1) optionChoices += 1;
      const [first, second] = options;
      const firstSplit = first === undefined ? null : askers.split(item, first);
      const secondSplit = second === undefined ? null : askers.split(item, second);
      const copies = askers.copies(item, options);
      for (let index = 0; index < contexts.length; index += 1) {
        total += 1;
        const cook = cooks[index]!;
        const copy = copies[index]!;
        const one = firstSplit?.[index] ?? null;
        const two = secondSplit?.[index] ?? null;
        const key = ((cook.number * stride + copy.number) * stride + (one === null ? 0 : one.number + 1)) * stride + (two === null ? 0 : two.number + 1);
        const ofTill = classesOfTill[tillOf[index]!]!;
        const known = ofTill.get(key);
        if (known !== undefined) {
          known.ways += 1;
          classOfWay.push(known.number);
          if (known.items.at(-1) !== item.id) known.items.push(item.id);
          continue;
        }
        const context = contexts[index]!;
        const made: OpenClass = {
          number: classes.length, till: context.till, cook, copies: copy,
          splits: [one, two].filter((split) => split !== null),
          first: { item: item.id, options, orderType: context.orderType, till: context.till },
          items: [item.id], ways: 1,
        };
        ofTill.set(key, made);
        classes.push(made);
        classOfWay.push(made.number);
      }
    }
  }
  return {
    total,
    items: items.length,
    optionChoices,
    tills: site.tills.length,
    orderTypes: new Set(contexts.map((context) => context.orderType)).size,
    classes,
    classOfWay,
    uses: score.uses(),
    ties: score.ties(),
  };
};
