import type { SectionId } from '../site/ids';
import type { PlanContent, Rule } from '../site/plan';
import type { BoardItem, BoardSite } from './board-site';
import { isUnconditional, sayConditions } from './conditions';
import { sayTarget, targetKey } from './targets';
import { countWords, listWords, readsAsPlural, splitsVerb } from './words';

export const sayStations = (site: BoardSite, stations: readonly string[]): string =>
  listWords(site.stations.filter((station) => stations.includes(station.id)).map((station) => station.name)) || 'a station that has gone';

/** Rules sorted by what they hang on, so that each card finds its own without reading them all. */
export type RuleIndex = {
  readonly sends: ReadonlyMap<string, readonly Rule[]>;
  readonly splits: readonly Rule[];
  readonly itemRulesOf: ReadonlyMap<SectionId, readonly Rule[]>;
  /** Offered options of a section's items, as ids. */
  readonly optionsOf: (section: SectionId | null) => ReadonlySet<string>;
  readonly items: ReadonlyMap<string, BoardItem>;
};

const groupBy = <Key, Value>(values: readonly Value[], keyOf: (value: Value) => Key | undefined): ReadonlyMap<Key, readonly Value[]> => {
  const groups = new Map<Key, Value[]>();
  for (const value of values) {
    const key = keyOf(value);
    if (key === undefined) continue;
    const group = groups.get(key);
    if (group === undefined) groups.set(key, [value]);
    else group.push(value);
  }
  return groups;
};

export const indexRules = (site: BoardSite, content: PlanContent): RuleIndex => {
  const sends = content.rules.filter((rule) => rule.kind === 'send');
  const items = new Map<string, BoardItem>(site.menu.items.map((item) => [item.id, item]));
  const groups = new Map<string, readonly string[]>(site.menu.optionGroups.map((group) => [group.id, group.options]));
  const optionsBySection = new Map<SectionId | null, Set<string>>();
  for (const item of site.menu.items) {
    for (const section of [item.section, null]) {
      const options = optionsBySection.get(section) ?? new Set<string>();
      optionsBySection.set(section, options);
      for (const group of item.optionGroups) for (const option of groups.get(group) ?? []) options.add(option);
    }
  }
  const none: ReadonlySet<string> = new Set();
  return {
    sends: groupBy(sends, (rule) => targetKey(rule.target)),
    splits: content.rules.filter((rule) => rule.kind === 'split'),
    itemRulesOf: groupBy(sends, (rule) => (rule.target.kind === 'item' ? items.get(rule.target.item)?.section : undefined)),
    optionsOf: (section) => optionsBySection.get(section) ?? none,
    items,
  };
};

/** Whether a split rule says anything of the dishes on this card. */
export const splitConcerns = (split: Rule, card: Rule['target'], index: RuleIndex, site: BoardSite): boolean => {
  const { target } = split;
  if (card.kind === 'item') {
    const item = index.items.get(card.item);
    if (target.kind === 'option-on-item') return target.item === card.item;
    if (target.kind === 'option-on-section') return target.section === item?.section;
    return target.kind === 'option' && item !== undefined
      && site.menu.optionGroups.some((group) => item.optionGroups.includes(group.id) && group.options.includes(target.option));
  }
  const section = card.kind === 'section' ? card.section : null;
  if (target.kind === 'option-on-item') return section !== null && index.items.get(target.item)?.section === section;
  if (target.kind === 'option-on-section') return target.section === section;
  return target.kind === 'option' && index.optionsOf(section).has(target.option);
};

const splitNotes = (rule: Rule, index: RuleIndex, site: BoardSite): readonly string[] =>
  index.splits
    .filter((split) => splitConcerns(split, rule.target, index, site) && split.stations.some((station) => !rule.stations.includes(station)))
    .map((split) => {
      const option = split.target.kind === 'option-on-section' && rule.target.kind === 'section'
        ? sayTarget({ kind: 'option', option: split.target.option }, site)
        : sayTarget(split.target, site);
      const when = sayConditions(split.conditions, site);
      return `${option} ${splitsVerb(option)} to ${sayStations(site, split.stations)}${when === '' ? '' : ` (${when})`}`;
    });

const conditionalNotes = (rule: Rule, index: RuleIndex, site: BoardSite): readonly string[] =>
  (index.sends.get(targetKey(rule.target)) ?? [])
    .filter((other) => !isUnconditional(other.conditions))
    .map((other) => {
      const when = sayConditions(other.conditions, site);
      return `${when} ${readsAsPlural(when) ? 'print' : 'prints'} at ${sayStations(site, other.stations)}`;
    });

const exceptionNotes = (rule: Rule, index: RuleIndex, site: BoardSite): readonly string[] => {
  if (rule.target.kind !== 'section') return [];
  const exceptions = index.itemRulesOf.get(rule.target.section) ?? [];
  if (exceptions.length > 2) return [`${countWords(exceptions.length, 'item')} go their own way`];
  return exceptions.map((exception) => {
    const when = sayConditions(exception.conditions, site);
    return `${sayTarget(exception.target, site)} to ${sayStations(site, exception.stations)}${when === '' ? '' : ` (${when})`}`;
  });
};

/** What a card has to say beside its own name: other ground, other options, other dishes. */
export const notesOf = (rule: Rule, index: RuleIndex, site: BoardSite): readonly string[] =>
  rule.kind === 'copy' || !isUnconditional(rule.conditions)
    ? []
    : [...splitNotes(rule, index, site), ...conditionalNotes(rule, index, site), ...exceptionNotes(rule, index, site)];
