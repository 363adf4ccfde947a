import type { ItemId, SectionId, StationId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { Divert, Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { compileReach } from '@/lib/domain/reach/compile-reach';
import { printerChooser, type Reaches } from './choose-printer';
import { compilePlan, type CompiledPlan } from './compile-plan';
import { followStations, type StationTrail } from './follow-stations';

/** Everything a line needs to find its printers: the plan read once, and the state of the kitchen read once. */
export type Routing = {
  readonly plan: CompiledPlan;
  readonly present: Present;
  readonly trails: ReadonlyMap<StationId, StationTrail>;
  readonly sectionDiverts: ReadonlyMap<SectionId, readonly StationId[]>;
  readonly itemDiverts: ReadonlyMap<ItemId, readonly StationId[]>;
  readonly printers: ReturnType<typeof printerChooser>;
};

/** The part of a routing that changes when something breaks, closes or is diverted. */
export const routingUnder = (site: Site, plan: CompiledPlan, present: Present, reaches: Reaches): Routing => ({
  plan,
  present,
  trails: followStations(site, present),
  sectionDiverts: new Map(present.diverts.flatMap((divert) => (divert.kind === 'section' ? [[divert.section, divert.to] as const] : []))),
  itemDiverts: new Map(present.diverts.flatMap((divert) => (divert.kind === 'item' ? [[divert.item, divert.to] as const] : []))),
  printers: printerChooser(site, present, reaches),
});

/** Which printers each till reaches, with some tills off. */
export const reachesOf = (site: Site, present: Pick<Present, 'offTills'>): Reaches => {
  const reach = compileReach(site, { offTills: present.offTills });
  return (till, printer) => reach(till, printer).reaches;
};

export const prepareRouting = (site: Site, plan: PlanContent, present: Present): Routing =>
  routingUnder(site, compilePlan(site, plan), present, reachesOf(site, present));

export type CookDivert = Extract<Divert, { readonly kind: 'section' | 'item' }>;

/** A divert of the item beats one of its section; the latest of each kind counts. */
export const cookDivertOf = (routing: Routing, item: ItemId): CookDivert | null => {
  const onItem = routing.itemDiverts.get(item);
  if (onItem !== undefined) return { kind: 'item', item, to: onItem };
  const section = routing.plan.sectionOf.get(item);
  const onSection = section === undefined ? undefined : routing.sectionDiverts.get(section);
  return section === undefined || onSection === undefined ? null : { kind: 'section', section, to: onSection };
};
