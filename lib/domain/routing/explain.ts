import type { StationId } from '@/lib/domain/site/ids';
import { orderTypeWords } from '@/lib/domain/site/order-types';
import type { Rule } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import type { PrinterTry } from './choose-printer';
import type { Dimension } from './narrowness';
import { listed, namesOf, type Names } from './names-of';
import type { Decision, LineRoute, SplitPart, StationRoute } from './route-line';

/** One sentence of an explanation: which of the seven steps it tells, and how it reads. */
export type Sentence = {
  readonly step: 1 | 2 | 3 | 4 | 5 | 6 | 7;
  /** The words to set strong, at the start of the sentence; may be empty. */
  readonly subject: string;
  readonly rest: string;
  readonly tone: 'plain' | 'look' | 'lost';
};

const say = (step: Sentence['step'], subject: string, rest: string, tone: Sentence['tone'] = 'plain'): Sentence => ({ step, subject, rest, tone });

/** What a rule is about, as a chef would say it. */
export const targetWords = (rule: Pick<Rule, 'target'>, names: Names): string => {
  const { target } = rule;
  switch (target.kind) {
    case 'everything': return 'Everything';
    case 'section': return names.section(target.section);
    case 'item': return names.item(target.item);
    case 'option': return names.option(target.option);
    case 'option-on-section': return `${names.option(target.option)} on ${names.section(target.section)}`;
    case 'option-on-item': return `${names.option(target.option)} on ${names.item(target.item)}`;
  }
};

/** "from Terrace, to take away", or nothing when the rule holds always. */
export const conditionWords = (rule: Pick<Rule, 'conditions'>, names: Names): string => {
  const { tills, areas, orderTypes } = rule.conditions;
  const from = [...tills.map(names.till), ...areas.map(names.area)];
  return [
    from.length > 0 ? `from ${listed(from, 'or')}` : '',
    orderTypes.length > 0 ? listed(orderTypes.map((type) => orderTypeWords[type]), 'or') : '',
  ].filter((words) => words !== '').join(', ');
};

const differenceWords: Readonly<Record<Dimension, string>> = {
  target: 'it is about less of the menu',
  till: 'it names the till',
  area: 'it names the area',
  orderType: 'it names how the guest takes it',
  later: 'it stands later in the plan, which is the only difference',
};

const stationList = (stations: readonly StationId[], names: Names): string => listed(stations.map(names.station));

const decisionSentences = (decision: Decision, route: LineRoute, names: Names): readonly Sentence[] => {
  const { winner, beaten } = decision;
  if (winner === null) return [say(1, names.item(route.item), ' has no rule that sends it to a station.', 'lost')];
  const when = conditionWords(winner, names);
  const sentences = [say(1, targetWords(winner, names), ` goes to ${stationList(winner.stations, names)}${when === '' ? '' : ` when ordered ${when}`}.`)];
  const [second] = beaten;
  if (second === undefined) {
    sentences.push(say(2, '', `No narrower rule for ${names.till(route.context.till)}, ${names.area(route.context.area)}, ${orderTypeWords[route.context.orderType]}.`));
    return sentences;
  }
  const tie = second.by === 'later' && !sameStations(winner, second.rule);
  sentences.push(say(2, '', `It wins over “${ruleWords(second.rule, names)}”, because ${differenceWords[second.by]}.`, tie ? 'look' : 'plain'));
  return sentences;
};

const sameStations = (left: Rule, right: Rule): boolean =>
  left.stations.length === right.stations.length && left.stations.every((station) => right.stations.includes(station));

/** A rule as one phrase: "Desserts from Terrace to Larder". */
export const ruleWords = (rule: Rule, names: Names): string => {
  const when = conditionWords(rule, names);
  const verb = rule.kind === 'copy' ? 'copied to' : rule.kind === 'split' ? 'split to' : 'to';
  return `${targetWords(rule, names)}${when === '' ? '' : ` ${when},`} ${verb} ${stationList(rule.stations, names)}`;
};

const splitSentence = (split: SplitPart, names: Names): Sentence => {
  const own = split.routes.filter((route) => route.reached === null || !split.withDish.includes(route.reached));
  const option = names.option(split.option);
  if (own.length === 0) return say(3, option, ` stays under its dish: ${stationList(split.withDish, names)} cooks both.`);
  const kept = split.keep ? ', and the dish’s ticket shows it too' : '';
  return say(3, option, ` splits to ${listed(own.map((route) => names.station(route.reached ?? route.asked)))} and names its dish${kept}.`);
};

const hopSentences = (route: StationRoute, names: Names): readonly Sentence[] => {
  const hops = route.trail.hops.map((hop) => say(5, names.station(hop.from), hop.because === 'closed'
    ? ` is closed, ${names.station(hop.to)} stands in.`
    : ` is diverted to ${names.station(hop.to)}.`, 'look'));
  if (route.reached !== null) return hops;
  const last = names.station(route.trail.hops.at(-1)?.to ?? route.asked);
  const end = route.trail.lostBecause === 'circle'
    ? say(5, last, ' leads back to a station already tried: the line is lost there.', 'lost')
    : say(5, last, ' is closed and has no stand-in: the line is lost there.', 'lost');
  return [...hops, end];
};

const whyNot = (tried: PrinterTry, till: string, names: Names): string =>
  tried.result === 'down' ? `${names.printer(tried.printer)} is down` : `${till} does not reach ${names.printer(tried.printer)}`;

const printerSentences = (route: StationRoute, till: string, names: Names): readonly Sentence[] => {
  if (route.choice === null || route.reached === null) return [];
  const failed = route.choice.tries.filter((tried) => tried.result !== 'prints');
  const winner = route.choice.tries.find((tried) => tried.result === 'prints');
  const station = names.station(route.reached);
  if (winner === undefined) {
    const reasons = failed.length === 0 ? 'it has no printer' : listed(failed.map((tried) => whyNot(tried, till, names)));
    return [say(6, station, ` prints nowhere: ${reasons}.`, 'lost')];
  }
  if (failed.length === 0 && winner.insteadOf === null) return [];
  const because = failed.length === 0 ? '' : `, since ${listed(failed.map((tried) => whyNot(tried, till, names)))}`;
  const diverted = winner.insteadOf === null ? '' : ` in place of ${names.printer(winner.insteadOf)}`;
  return [say(6, names.printer(winner.printer), ` prints for ${station}${diverted}${because}.`, 'look')];
};

/** The printers that print at the first try, all in one sentence. */
const answeringSentence = (routes: readonly StationRoute[], till: string, names: Names): readonly Sentence[] => {
  const first = routes.flatMap((route) => route.choice?.tries.slice(0, 1) ?? []).filter((tried) => tried.result === 'prints' && tried.insteadOf === null);
  const printers = [...new Set(first.map((tried) => names.printer(tried.printer)))];
  return printers.length === 0 ? [] : [say(6, listed(printers), ` ${printers.length === 1 ? 'answers' : 'answer'} from ${till}.`)];
};

const outcomeSentence = (route: LineRoute, names: Names): Sentence => {
  if (route.outcome === 'prints') return say(7, '', 'Every station that cooks it gets its ticket.');
  const dry = [...route.cook.routes, ...route.splits.flatMap((split) => split.routes)].filter((one) => one.printer === null);
  const where = listed([...new Set(dry.map((one) => names.station(one.reached ?? one.asked)))]);
  return route.outcome === 'lost'
    ? say(7, 'Lost.', ' No kitchen ticket prints for this line.', 'lost')
    : say(7, 'Part lost.', where === '' ? ' The dish itself prints nowhere.' : ` Nothing prints for ${where}.`, 'lost');
};

const once = (sentences: readonly Sentence[]): readonly Sentence[] => {
  const seen = new Set<string>();
  return sentences.filter((sentence) => {
    const key = `${sentence.step}${sentence.subject}${sentence.rest}`;
    return seen.has(key) ? false : seen.add(key) && true;
  });
};

/** Says in short sentences why a line prints where it prints, step by step, from its record alone. */
export const explainLine = (route: LineRoute, site: Site): readonly Sentence[] => {
  const names = namesOf(site);
  const till = names.till(route.context.till);
  const { divert } = route.cook;
  const parts = [...route.cook.routes, ...route.splits.flatMap((split) => split.routes), ...route.copies];
  return once([
    ...decisionSentences(route.cook.decision, route, names),
    ...route.splits.map((split) => splitSentence(split, names)),
    ...route.copies.map((copy) => say(4, names.station(copy.reached ?? copy.asked), ` gets a copy: ${ruleWords(copy.rule, names)}.`)),
    ...(divert === null ? [] : [say(5, divert.kind === 'item' ? names.item(divert.item) : names.section(divert.section), ` is diverted to ${stationList(divert.to, names)} for now.`, 'look')]),
    ...parts.flatMap((part) => hopSentences(part, names)),
    ...answeringSentence(parts, till, names),
    ...parts.flatMap((part) => printerSentences(part, till, names)),
    outcomeSentence(route, names),
  ]);
};
