import type { Dependents } from '../checks/dependents';
import { listWords } from '../plans/words';
import type { StationId } from '../site/ids';
import type { Site } from '../site/site';

/** A station that a plan sends to stays, so that no plan loses a rule unseen; who leaned on it goes on without. */
export const dependentsOfStation = (site: Pick<Site, 'stations' | 'plans'>, station: StationId): Dependents => {
  const plans = site.plans.filter((plan) => plan.rules.some((rule) => rule.stations.includes(station))).map((plan) => plan.name);
  const leaning = site.stations.filter((one) => one.standIn === station).map((one) => one.name);
  return {
    obstacles: plans.length === 0 ? [] : [`${listWords(plans)} ${plans.length === 1 ? 'sends' : 'send'} dishes or copies to it. Send them elsewhere on the board first.`],
    consequences: leaning.length === 0 ? [] : [`${listWords(leaning)} ${leaning.length === 1 ? 'has' : 'have'} no stand-in any more.`],
  };
};
