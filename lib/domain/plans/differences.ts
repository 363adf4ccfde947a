import type { PlanContent, Rule } from '../site/plan';
import type { BoardSite } from './board-site';
import { sayStations } from './card-notes';
import { conditionsKey, isUnconditional, sayConditions } from './conditions';
import { sayRule } from './say-rule';
import { sayTarget, targetKey } from './targets';
import { capitalise } from './words';

export type Difference = { readonly key: string; readonly words: string };

const keyOf = (rule: Rule): string => [rule.kind, targetKey(rule.target), conditionsKey(rule.conditions)].join('/');

const grouped = (rules: readonly Rule[]): ReadonlyMap<string, readonly Rule[]> => {
  const groups = new Map<string, Rule[]>();
  for (const rule of rules) groups.set(keyOf(rule), [...(groups.get(keyOf(rule)) ?? []), rule]);
  return groups;
};

const sameSet = (left: readonly string[], right: readonly string[]): boolean =>
  left.length === right.length && left.every((member) => right.includes(member));

const sameRules = (before: readonly Rule[], after: readonly Rule[]): boolean =>
  before.length === after.length && before.every((rule, place) => {
    const other = after[place];
    return other !== undefined && sameSet(rule.stations, other.stations) && rule.keep === other.keep;
  });

const sayChange = (before: readonly Rule[], after: readonly Rule[], site: BoardSite): string => {
  const [was] = before.slice(-1);
  const [is] = after.slice(-1);
  if (is === undefined) return was === undefined ? '' : `No longer: ${sayRule(was, site)}`;
  if (was === undefined || is.kind !== 'send' || sameSet(was.stations, is.stations)) return sayRule(is, site);
  const when = isUnconditional(is.conditions) ? '' : `, only ${sayConditions(is.conditions, site)}`;
  return capitalise(`${sayTarget(is.target, site)} from ${sayStations(site, was.stations)} to ${sayStations(site, is.stations)}${when}`);
};

/** For each kind and target, its rules' conditions in order, as far as both contents have them. */
const sequences = (rules: readonly Rule[], shared: ReadonlySet<string>): ReadonlyMap<string, string> => {
  const byTarget = new Map<string, string>();
  for (const rule of rules) {
    if (!shared.has(keyOf(rule))) continue;
    const about = `${rule.kind}/${targetKey(rule.target)}`;
    byTarget.set(about, `${byTarget.get(about) ?? ''} ${conditionsKey(rule.conditions)}`);
  }
  return byTarget;
};

/** Order matters only between rules about the same target, which can tie; ids do not count, undo makes new ones. */
const orderChanged = (before: readonly Rule[], after: readonly Rule[]): boolean => {
  const keysAfter = new Set(after.map(keyOf));
  const shared = new Set(before.map(keyOf).filter((key) => keysAfter.has(key)));
  const now = sequences(after, shared);
  return [...sequences(before, shared)].some(([about, order]) => now.get(about) !== order);
};

const offerChanges = (before: PlanContent, after: PlanContent, site: BoardSite): readonly Difference[] =>
  site.menu.sections.flatMap((section) => {
    const was = before.offers?.includes(section.id) ?? true;
    const is = after.offers?.includes(section.id) ?? true;
    return was === is ? [] : [{ key: `offer/${section.id}`, words: `${section.name} ${is ? 'offered' : 'not offered'}` }];
  });

/** What a person changed between two contents, one line each; empty when they would print alike. */
export const differences = (before: PlanContent, after: PlanContent, site: BoardSite): readonly Difference[] => {
  const was = grouped(before.rules);
  const is = grouped(after.rules);
  const changed = [...new Set([...was.keys(), ...is.keys()])].flatMap((key) => {
    const left = was.get(key) ?? [];
    const right = is.get(key) ?? [];
    return sameRules(left, right) ? [] : [{ key, words: sayChange(left, right, site) }];
  });
  const reordered = orderChanged(before.rules, after.rules) ? [{ key: 'order', words: 'Rules in another order' }] : [];
  return [...changed, ...reordered, ...offerChanges(before, after, site)];
};
