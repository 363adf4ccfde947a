import { ruleWords, targetWords } from '@/lib/domain/routing/explain';
import { listed, namesOf, type Names } from '@/lib/domain/routing/names-of';
import type { Fix } from '@/lib/domain/findings/finding';
import type { Plan, Rule } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { sayWay, type ProofFinding } from './summary';
import type { RuleUse, Tie, Ways } from './way';

const removeRule = (plan: Plan, rule: Rule): readonly Fix[] => [{ kind: 'remove-rule', plan: plan.id, rule: rule.id, label: 'Remove the rule' }];

const sameStations = (left: Rule, right: Rule): boolean =>
  left.stations.length === right.stations.length && left.stations.every((station) => right.stations.includes(station));

const tieFinding = (site: Site, plan: Plan, names: Names, { winner, loser, way }: Tie): ProofFinding => {
  const same = sameStations(winner, loser);
  return {
    code: same ? 'tie-same-stations' : 'tie', severity: same ? 'note' : 'check', subject: { kind: 'rule', id: winner.id },
    title: `Two rules say where ${targetWords(loser, names)} goes`,
    message: `“${ruleWords(winner, names)}” wins over “${ruleWords(loser, names)}” only because it stands later in the plan. For example: ${sayWay(way, site)}.`,
    fixes: removeRule(plan, loser), example: way,
  };
};

/** What a rule that never wins has to be told: nothing to cover, taken by equals, or all exceptions. */
const findingOfUse = (plan: Plan, names: Names, use: RuleUse): ProofFinding | null => {
  if (use.won > 0) return null;
  const words = ruleWords(use.rule, names);
  const shared = { subject: { kind: 'rule' as const, id: use.rule.id }, fixes: removeRule(plan, use.rule), example: null };
  if (use.beatenByEqual > 0) {
    return { ...shared, code: 'rule-shadowed', severity: 'check', title: `“${words}” never decides anything`, message: 'Rules just as narrow that stand later in the plan take all of it.' };
  }
  if (use.beatenByNarrower > 0) {
    return { ...shared, code: 'rule-all-exceptions', severity: 'note', title: `“${words}” is all exceptions`, message: 'Narrower rules take everything it is about.' };
  }
  return { ...shared, code: 'rule-covers-nothing', severity: 'check', title: `“${words}” covers nothing`, message: 'Nothing that this plan offers fits it, or its till, area and order type never come together.' };
};

const circleFinding = (kind: 'station' | 'printer', circle: readonly string[], nameOf: (id: never) => string): ProofFinding => {
  const called = circle.map((id) => nameOf(id as never));
  const station = kind === 'station';
  return {
    code: station ? 'stand-in-circle' : 'backup-circle', severity: 'note', subject: { kind, id: circle[0] ?? '' },
    title: `${listed(called)} ${station ? 'stand in for each other' : 'back each other up'}`,
    message: `${[...called, called[0] ?? ''].join(' → ')}. When all of them are ${station ? 'closed, their dishes' : 'down, their tickets'} are lost.`,
    fixes: [], example: null,
  };
};

export const ruleFindings = (site: Site, plan: Plan, ways: Ways): readonly ProofFinding[] => {
  const names = namesOf(site);
  return [
    ...ways.ties.map((tie) => tieFinding(site, plan, names, tie)),
    ...ways.uses.flatMap((use) => findingOfUse(plan, names, use) ?? []),
    ...circles(site.stations.map(({ id, standIn }) => [id, standIn] as const)).map((circle) => circleFinding('station', circle, names.station)),
    ...circles(site.printers.map(({ id, backup }) => [id, backup] as const)).map((circle) => circleFinding('printer', circle, names.printer)),
  ];
};

/** Each circle once, from its first member in the order given. */
export const circles = <Id extends string>(links: readonly (readonly [Id, Id | null])[]): readonly (readonly Id[])[] => {
  const next = new Map(links);
  const done = new Set<Id>();
  return links.flatMap(([start]) => {
    const path: Id[] = [];
    let now: Id | null = start;
    while (now !== null && !done.has(now) && !path.includes(now)) {
      path.push(now);
      now = next.get(now) ?? null;
    }
    const circle = now === null || done.has(now) ? [] : path.slice(path.indexOf(now));
    for (const one of path) done.add(one);
    return circle.length > 0 ? [circle] : [];
  });
};
