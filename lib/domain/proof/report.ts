import type { Order } from '@/lib/domain/orders/order';
import { refuseOrder, type Refusal } from '@/lib/domain/orders/refuse-order';
import { explainLine } from '@/lib/domain/routing/explain';
import { routeOrder, type Clock, type RoutedOrder } from '@/lib/domain/routing/route-order';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { runDrill, type DrillResult, type Fault } from './drill';
import { proposeFor } from './propose';
import { provePlan, type Proof } from './prove';

/** A proof for a machine: plain JSON, same words as on screen. */
export const reportProof = (proof: Proof) => {
  const count = (outcome: string): number => proof.judgements.filter((one) => one.outcome === outcome).reduce((sum, one) => sum + one.of.ways, 0);
  return {
    ways: { total: proof.ways.total, items: proof.ways.items, optionChoices: proof.ways.optionChoices, tills: proof.ways.tills, orderTypes: proof.ways.orderTypes },
    outcomes: { prints: count('prints'), partLost: count('part lost'), lost: count('lost') },
    findings: proof.findings,
  };
};

export const faultName = (site: Site, fault: Fault): string => {
  const nameIn = (things: readonly { readonly id: string; readonly name: string }[], id: string): string => things.find((one) => one.id === id)?.name ?? id;
  switch (fault.kind) {
    case 'printer': return nameIn(site.printers, fault.printer);
    case 'station': return nameIn(site.stations, fault.station);
    case 'till': return nameIn(site.tills, fault.till);
    case 'shared-point': return nameIn(site.sharedPoints, fault.sharedPoint);
    case 'printers': return fault.printers.map((printer) => nameIn(site.printers, printer)).join(' and ');
  }
};

/** The drill for a machine: single points of failure first, then minimal pairs, each with what would help. */
export const reportDrill = (site: Site, plan: Plan) => {
  const { ways } = provePlan(site, plan);
  const drill = runDrill(site, plan, ways);
  const line = (result: DrillResult) => ({
    fault: result.fault, name: faultName(site, result.fault), lostItems: result.lostItems, partLostItems: result.partLostItems, tills: result.tills,
    lostWays: result.lostWays, proposal: proposeFor(site, plan, ways, result),
  });
  return { single: drill.single.map(line), pairs: drill.pairs.map((pair) => ({ ...line(pair), beyond: pair.beyond })), harmless: drill.harmless.map((fault) => ({ fault, name: faultName(site, fault) })) };
};

export type OrderReport =
  | { readonly ok: false; readonly refusals: readonly Refusal[] }
  | { readonly ok: true; readonly routed: RoutedOrder; readonly explanations: readonly { readonly line: number; readonly sentences: readonly string[] }[] };

/** One order for a machine: refused line by line, or its tickets with the explanation of each line. */
export const reportOrder = (site: Site, plan: Plan, present: Present, order: Order, clock: Clock): OrderReport => {
  const refusals = refuseOrder(order, site);
  if (refusals.length > 0) return { ok: false, refusals };
  const routed = routeOrder(site, plan, present, order, clock);
  return {
    ok: true,
    routed,
    explanations: routed.lines.map((line) => ({
      line: line.line,
      sentences: line.route === null ? [line.outcome === 'refused' ? line.reason : 'This item needs no ticket.'] : explainLine(line.route, site).map(({ subject, rest }) => `${subject}${rest}`),
    })),
  };
};
