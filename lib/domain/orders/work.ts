import { makeTickets, type TicketHead } from '@/lib/domain/routing/make-tickets';
import type { Loss, Piece } from '@/lib/domain/routing/pieces';
import type { Clock } from '@/lib/domain/routing/route-order';
import { prepareRouting, reachesOf, type Routing } from '@/lib/domain/routing/routing';
import type { CourseId, TillId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { LineMark, Ticket } from '@/lib/domain/tickets/ticket';
import { followUp, type FollowUp } from './follow-up';
import { quantityLeft, type PrintedPart, type Tab, type TabLine } from './tab';

/** The kitchen at the moment of an event: the plan that is live, what is shut or down, and the time. */
export type Kitchen = { readonly site: Site; readonly plan: Plan; readonly present: Present; readonly clock: Clock };

export type Printed = {
  readonly tickets: readonly Ticket[];
  readonly losses: readonly Loss[];
  /** Sentences about what could not be done at all; the tab is then as it was for that line. */
  readonly refusals: readonly string[];
};

export type Step = readonly [tab: Tab, printed: Printed];

/** One event in hand: the kitchen read once, and the two ways to print. */
export type Work = {
  readonly kitchen: Kitchen;
  readonly routing: Routing;
  readonly tab: Tab;
  /** Prints word of lines where they printed. */
  readonly follow: (indexes: readonly number[], till: TillId, marks: readonly LineMark[], choose?: { readonly quantityOf?: (line: TabLine) => number; readonly parts?: (part: PrintedPart) => boolean }) => FollowUp;
  readonly print: (tab: Tab, till: TillId, event: TicketHead['event'], made: FollowUp, sending?: number) => Printed;
};

export const partsOf = (pieces: readonly Piece[], index: number): readonly PrintedPart[] =>
  pieces.filter((piece) => piece.sourceLine === index).map(({ kind, option, station, printer }) => ({ kind, option, station, printer }));

export const courseOf = (site: Site, { line }: TabLine): CourseId | null => line.course ?? site.menu.items.find((item) => item.id === line.item)?.course ?? null;

export const courseName = (site: Site, course: CourseId | null): string => site.courses.find((one) => one.id === course)?.name ?? 'All';

export const indexesOf = (tab: Tab, wanted: (line: TabLine) => boolean): readonly number[] =>
  tab.lines.flatMap((line, index) => (wanted(line) && quantityLeft(line) > 0 ? [index] : []));

export const nothing = (...refusals: readonly string[]): Printed => ({ tickets: [], losses: [], refusals });

export const begin = (kitchen: Kitchen, tab: Tab): Work => {
  const routing = prepareRouting(kitchen.site, kitchen.plan, kitchen.present);
  const reaches = reachesOf(kitchen.site, kitchen.present);
  const { site } = kitchen;
  return {
    kitchen, routing, tab,
    follow: (indexes, till, marks, { quantityOf = quantityLeft, parts = () => true } = {}) => {
      const made = indexes.map((index) => {
        const line = tab.lines[index]!;
        return followUp(site, routing, reaches, tab.allergies, { ...line, printed: line.printed.filter(parts) }, index, till, marks, quantityOf(line));
      });
      return { pieces: made.flatMap(({ pieces }) => pieces), losses: made.flatMap(({ losses }) => losses) };
    },
    print: (after, till, event, made, sending = after.sendings) => ({
      tickets: makeTickets(site, made.pieces, {
        event, table: after.table, covers: after.covers, orderType: after.orderType, server: after.server, orderNumber: after.number, sending,
        till: site.tills.find((one) => one.id === till)?.name ?? '', time: kitchen.clock.time,
      }, after.allergies.filter((allergy) => allergy.seat === null).map((allergy) => allergy.words)),
      losses: made.losses,
      refusals: [],
    }),
  };
};

