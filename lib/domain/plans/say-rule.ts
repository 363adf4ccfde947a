import type { Rule } from '../site/plan';
import type { BoardSite } from './board-site';
import { sayStations } from './card-notes';
import { isUnconditional, sayConditions } from './conditions';
import { sayTarget } from './targets';
import { capitalise, splitsVerb } from './words';

/** A rule as one sentence without its full stop: "Burgers to Grill when Terrace", "Copy of everything to Pass". */
export const sayRule = (rule: Rule, site: BoardSite): string => {
  const stations = sayStations(site, rule.stations);
  const target = sayTarget(rule.target, site);
  const when = isUnconditional(rule.conditions) ? '' : `, only ${sayConditions(rule.conditions, site)}`;
  if (rule.kind === 'send') return capitalise(`${target} to ${stations}${when}`);
  if (rule.kind === 'copy') return `Copy of ${target === 'Everything' ? 'everything' : target} to ${stations}${when}`;
  return capitalise(`${target} ${splitsVerb(target)} to ${stations}${rule.keep ? ', and stays on the dish' : ''}${when}`);
};
