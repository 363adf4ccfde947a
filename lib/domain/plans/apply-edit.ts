import type { RuleId, SectionId, StationId } from '../site/ids';
import type { Conditions, PlanContent, Rule, RuleKind, Target } from '../site/plan';
import { anyCondition } from '../site/plan';
import { conditionsKey } from './conditions';
import type { HungCard, PlanEdit } from './edit';
import { targetKey } from './targets';

type NewId = () => RuleId;
type Rules = readonly Rule[];

const union = (stations: readonly StationId[], more: readonly StationId[]): readonly StationId[] => [...new Set([...stations, ...more])];
const without = (stations: readonly StationId[], less: readonly StationId[]): readonly StationId[] =>
  stations.filter((station) => !less.includes(station));
const swap = (stations: readonly StationId[], from: StationId, to: StationId): readonly StationId[] =>
  [...new Set(stations.map((station) => (station === from ? to : station)))];

/** Changes the rule of this kind that has exactly this target and these conditions, or adds it last. */
const put = (rules: Rules, about: { kind: RuleKind; target: Target; conditions: Conditions }, newId: NewId, change: (rule: Rule) => Rule): Rules => {
  const same = (rule: Rule): boolean =>
    rule.kind === about.kind && targetKey(rule.target) === targetKey(about.target) && conditionsKey(rule.conditions) === conditionsKey(about.conditions);
  // The last of several equals is the one that wins, so it is the one that a person sees and means.
  const standing = rules.findLast(same);
  const changed = change(standing ?? { id: newId(), ...about, stations: [], keep: false });
  if (standing === undefined) return changed.stations.length === 0 ? rules : [...rules, changed];
  return rules.flatMap((rule) => {
    if (rule === standing) return changed.stations.length === 0 ? [] : [changed];
    return same(rule) && rule.kind === 'send' ? [] : [rule];
  });
};

const changeStations = (rules: Rules, id: RuleId, change: (stations: readonly StationId[]) => readonly StationId[]): Rules =>
  rules.flatMap((rule) => {
    if (rule.id !== id) return [rule];
    const stations = change(rule.stations);
    return stations.length === 0 ? [] : [{ ...rule, stations }];
  });

const hangOne = (rules: Rules, card: HungCard, to: StationId | null, newId: NewId): Rules => {
  const { rule, from, target } = card;
  if (rule !== null && from !== null && rules.some((standing) => standing.id === rule)) {
    return changeStations(rules, rule, (stations) => (to === null ? without(stations, [from]) : swap(stations, from, to)));
  }
  if (to === null || target.kind === 'option') return rules;
  return put(rules, { kind: 'send', target, conditions: anyCondition }, newId, (standing) => ({ ...standing, stations: [to] }));
};

const sendStations = (edit: Extract<PlanEdit, { kind: 'send' | 'copy' }>, standing: readonly StationId[]): readonly StationId[] => {
  if (edit.how === 'replace') return [...new Set(edit.stations)];
  return edit.how === 'add' ? union(standing, edit.stations) : without(standing, edit.stations);
};

const reorder = (rules: Rules, id: RuleId, above: RuleId | null): Rules => {
  const moved = rules.find((rule) => rule.id === id);
  if (moved === undefined || id === above) return rules;
  const rest = rules.filter((rule) => rule !== moved);
  const place = above === null ? -1 : rest.findIndex((rule) => rule.id === above);
  return place === -1 ? [...rest, moved] : rest.toSpliced(place, 0, moved);
};

const offer = (offers: readonly SectionId[] | null, edit: Extract<PlanEdit, { kind: 'offer' }>): readonly SectionId[] | null => {
  const offered = new Set(offers ?? edit.all);
  for (const section of edit.sections) {
    if (edit.offered) offered.add(section);
    else offered.delete(section);
  }
  return edit.all.every((section) => offered.has(section)) ? null : edit.all.filter((section) => offered.has(section));
};

const changeRule = (rules: Rules, edit: Extract<PlanEdit, { kind: 'change-rule' }>): Rules =>
  rules.flatMap((rule) => {
    if (rule.id !== edit.rule) return [rule];
    const stations = edit.stations ?? rule.stations;
    if (stations.length === 0) return [];
    return [{ ...rule, stations, conditions: edit.conditions ?? rule.conditions, keep: edit.keep ?? rule.keep }];
  });

/**
 * The content after one edit; the given one is left as it is. An edit about a rule that has gone changes nothing,
 * so that it can be tried again on newer content. `newId` makes an id for each rule that the edit adds.
 */
export const applyEdit = (content: PlanContent, edit: PlanEdit, newId: NewId): PlanContent => {
  const withRules = (rules: Rules): PlanContent => ({ ...content, rules });
  switch (edit.kind) {
    case 'send':
      return withRules(edit.targets.reduce<Rules>((rules, target) => put(rules, { kind: 'send', target, conditions: edit.conditions }, newId,
        (rule) => ({ ...rule, stations: sendStations(edit, rule.stations) })), content.rules));
    case 'hang':
      return withRules(edit.cards.reduce<Rules>((rules, card) => hangOne(rules, card, edit.to, newId), content.rules));
    case 'take-off': {
      const keys = new Set(edit.targets.map(targetKey));
      return withRules(content.rules.filter((rule) => rule.kind !== 'send' || !keys.has(targetKey(rule.target))));
    }
    case 'split':
      return withRules(put(content.rules, { kind: 'split', target: edit.target, conditions: edit.conditions }, newId,
        (rule) => ({ ...rule, stations: [...new Set(edit.stations)], keep: edit.keep })));
    case 'copy':
      return withRules(edit.targets.reduce<Rules>((rules, target) => put(rules, { kind: 'copy', target, conditions: edit.conditions }, newId,
        (rule) => ({ ...rule, stations: sendStations(edit, rule.stations) })), content.rules));
    case 'change-rule': return withRules(changeRule(content.rules, edit));
    case 'remove-rules': return withRules(content.rules.filter((rule) => !edit.rules.includes(rule.id)));
    case 'reorder': return withRules(reorder(content.rules, edit.rule, edit.above));
    case 'offer': return { ...content, offers: offer(content.offers, edit) };
    case 'restore': return edit.content;
  }
};

/** The edit that takes any other back: the content that stood before it. */
export const inverseOf = (before: PlanContent, words: string): PlanEdit => ({ kind: 'restore', content: before, words });
