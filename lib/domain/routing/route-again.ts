import { cookingStations, outcomeOfRoutes, routeToStation, type LineRoute } from './route-line';
import { cookDivertOf, type Routing } from './routing';
import type { StationId, TillId } from '@/lib/domain/site/ids';

/**
 * A held line is fired: the rules that won at its sending hold, and where they lead is worked out anew, from the till
 * that fires and with what is closed, diverted and down now.
 */
export const routeAgain = (routing: Routing, sent: LineRoute, till: TillId): LineRoute => {
  const context = { ...sent.context, till };
  const divert = cookDivertOf(routing, sent.item);
  const asked = divert?.to ?? sent.cook.decision.winner?.stations ?? [];
  const routes = asked.map((station) => routeToStation(routing, station, context));
  const cooking = cookingStations(routes);
  const splits = sent.splits.map((split) => {
    const again = (split.decision.winner?.stations ?? []).map((station) => routeToStation(routing, station, context));
    return { ...split, routes: again, outcome: outcomeOfRoutes(again), withDish: again.flatMap((one) => (one.reached !== null && cooking.has(one.reached) ? [one.reached] : [])) };
  });
  const copied = new Set<StationId>();
  const copies = sent.copies.map((copy) => ({ ...routeToStation(routing, copy.asked, context), rule: copy.rule })).filter((copy) => {
    const station = copy.reached ?? copy.asked;
    return !cooking.has(station) && !copied.has(station) && copied.add(station) && true;
  });
  const parts = [...routes, ...splits.flatMap((split) => split.routes)];
  const outcome = routes.length > 0 ? outcomeOfRoutes(parts) : splits.some((split) => split.outcome !== 'lost') ? 'part lost' : 'lost';
  return { ...sent, context, cook: { decision: sent.cook.decision, divert, routes, outcome: outcomeOfRoutes(routes) }, splits, copies, outcome };
};
