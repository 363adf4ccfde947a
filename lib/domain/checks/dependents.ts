import type { AreaId, PrinterId, TillId } from '../site/ids';
import type { Rule } from '../site/plan';
import type { Site } from '../site/site';

/** What hangs on a thing that somebody wants to take off the list. */
export type Dependents = {
  /** Sentences about what goes with it or loses it. */
  readonly consequences: readonly string[];
  /** Sentences about what has to be changed first; while there are any, it stays. */
  readonly obstacles: readonly string[];
};

const listed = (names: readonly string[]): string =>
  names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;

const sentence = (names: readonly string[], say: (list: string, many: boolean) => string): readonly string[] =>
  names.length === 0 ? [] : [say(listed(names), names.length > 1)];

/** A printer can always go; whatever used it goes on without. */
export const dependentsOfPrinter = (site: Pick<Site, 'stations' | 'printers' | 'tills'>, printer: PrinterId): Dependents => {
  const stations = site.stations.filter((station) => station.printers.includes(printer));
  const stranded = stations.filter((station) => station.printers.length === 1).map((station) => station.name);
  const others = stations.filter((station) => station.printers.length > 1).map((station) => station.name);
  return {
    obstacles: [],
    consequences: [
      ...sentence(stranded, (list, many) => `${list} ${many ? 'have' : 'has'} no other printer, so what is cooked there prints nowhere.`),
      ...sentence(others, (list, many) => `${list} ${many ? 'print' : 'prints'} on the other printers of ${many ? 'their lists' : 'its list'}.`),
      ...sentence(site.printers.filter((one) => one.backup === printer).map((one) => one.name), (list, many) => `${list} ${many ? 'have' : 'has'} no backup any more.`),
      ...sentence(site.tills.filter((till) => till.queues.some((queue) => queue.printer === printer)).map((till) => till.name), (list) => `It is forgotten on ${list}.`),
    ],
  };
};

const rulesNaming = (site: Pick<Site, 'plans'>, names: (rule: Rule) => boolean): readonly string[] =>
  site.plans.filter((plan) => plan.rules.some(names)).map((plan) => plan.name);

const ruleObstacle = (plans: readonly string[]): readonly string[] =>
  sentence(plans, (list, many) => `${list} ${many ? 'have' : 'has'} rules for it. Change ${many ? 'them' : 'those'} on the board first; without their condition they would cover everything.`);

/** A till that others need stays until they have another way. */
export const dependentsOfTill = (site: Pick<Site, 'plans' | 'printers' | 'tills' | 'link'>, till: TillId): Dependents => ({
  obstacles: [
    ...ruleObstacle(rulesNaming(site, (rule) => rule.conditions.tills.includes(till))),
    ...sentence(site.printers.filter((printer) => printer.hostTill === till).map((printer) => printer.name), (list, many) => `${list} ${many ? 'are' : 'is'} plugged into it. Say first where ${many ? 'they hang' : 'it hangs'} now.`),
    ...sentence(site.tills.filter((one) => one.printsThrough === till).map((one) => one.name), (list, many) => `${list} ${many ? 'print' : 'prints'} through it. Give ${many ? 'them' : 'it'} another way first.`),
    ...(site.link.kind === 'till' && site.link.till === till ? ['The print link runs on it. Move the link first.'] : []),
  ],
  consequences: sentence(
    site.tills.filter((one) => one.id === till && one.queues.length > 0).map((one) => `${one.queues.length} ${one.queues.length === 1 ? 'printer' : 'printers'}`),
    (list) => `What is written down about ${list} on it, tests included, goes too.`,
  ),
});

export const dependentsOfArea = (site: Pick<Site, 'plans' | 'tills'>, area: AreaId): Dependents => ({
  obstacles: [
    ...sentence(site.tills.filter((till) => till.area === area).map((till) => till.name), (list, many) => `${list} ${many ? 'stand' : 'stands'} in it. Move ${many ? 'them' : 'it'} first.`),
    ...ruleObstacle(rulesNaming(site, (rule) => rule.conditions.areas.includes(area))),
  ],
  consequences: [],
});
