import type { PlanContent, Rule } from '../site/plan';
import type { BoardSite } from './board-site';
import { sayStations } from './card-notes';
import { isUnconditional, sayConditions } from './conditions';
import type { HungCard, PlanEdit } from './edit';
import { sayRule } from './say-rule';
import type { CopyTarget, SendTarget } from './targets';
import { sayTarget } from './targets';
import { capitalise, countWords, listWords, splitsVerb } from './words';

/** Two names at most, then a count in the kitchen's words. */
const sayTargets = (targets: readonly (SendTarget | CopyTarget)[], site: BoardSite): string => {
  if (targets.length <= 2) return listWords(targets.map((target) => sayTarget(target, site)));
  if (targets.every((target) => target.kind === 'section')) return countWords(targets.length, 'menu section');
  if (targets.every((target) => target.kind === 'item')) return countWords(targets.length, 'item');
  return countWords(targets.length, 'card');
};

const when = (conditions: Rule['conditions'], site: BoardSite): string =>
  isUnconditional(conditions) ? '' : ` (${sayConditions(conditions, site)})`;

const sayHang = (cards: readonly HungCard[], to: string | null, site: BoardSite): string => {
  const names = sayTargets(cards.map((card) => card.target), site);
  if (to !== null) return `${names} to ${sayStations(site, [to])}`;
  const froms = [...new Set(cards.flatMap((card) => (card.from === null ? [] : [card.from])))];
  return `${names} off ${sayStations(site, froms)}`;
};

const saySend = (edit: Extract<PlanEdit, { kind: 'send' }>, site: BoardSite): string => {
  const names = sayTargets(edit.targets, site);
  const stations = sayStations(site, edit.stations);
  if (edit.stations.length === 0) return `${names} to no station${when(edit.conditions, site)}`;
  if (edit.how === 'remove') return `${names} off ${stations}${when(edit.conditions, site)}`;
  return `${names} ${edit.how === 'add' ? 'also to' : 'to'} ${stations}${when(edit.conditions, site)}`;
};

const ofRule = (content: PlanContent, id: string, site: BoardSite): string => {
  const rule = content.rules.find((candidate) => candidate.id === id);
  return rule === undefined ? 'A rule that has gone' : sayRule(rule, site);
};

/** One short line for the history and for Undo, read against the content that the edit is made on. */
export const describeEdit = (edit: PlanEdit, site: BoardSite, content: PlanContent): string => {
  switch (edit.kind) {
    case 'send': return capitalise(saySend(edit, site));
    case 'hang': return capitalise(sayHang(edit.cards, edit.to, site));
    case 'take-off': return capitalise(`${sayTargets(edit.targets, site)} off every station`);
    case 'split':
      return edit.stations.length === 0
        ? capitalise(`${sayTarget(edit.target, site)} stays with its dish${when(edit.conditions, site)}`)
        : capitalise(`${sayTarget(edit.target, site)} ${splitsVerb(sayTarget(edit.target, site))} to ${sayStations(site, edit.stations)}${when(edit.conditions, site)}`);
    case 'copy': {
      const names = edit.targets.some((target) => target.kind === 'everything') ? 'everything' : sayTargets(edit.targets, site);
      const stations = sayStations(site, edit.stations);
      return `${edit.how === 'add' ? `Copy of ${names} to ${stations}` : `No copy of ${names} at ${stations}`}${when(edit.conditions, site)}`;
    }
    case 'change-rule': {
      const rule = content.rules.find((candidate) => candidate.id === edit.rule);
      if (rule === undefined) return 'A rule that has gone';
      return sayRule({ ...rule, stations: edit.stations ?? rule.stations, conditions: edit.conditions ?? rule.conditions, keep: edit.keep ?? rule.keep }, site);
    }
    case 'remove-rules':
      return edit.rules.length === 1 ? `No longer: ${ofRule(content, edit.rules[0] ?? '', site)}` : `${countWords(edit.rules.length, 'rule')} removed`;
    case 'reorder': return `${ofRule(content, edit.rule, site)}, in another order`;
    case 'offer': {
      const names = sayTargets(edit.sections.map((section) => ({ kind: 'section', section })), site);
      return capitalise(`${names} ${edit.offered ? 'offered' : 'not offered'}`);
    }
    case 'restore': return edit.words;
  }
};
