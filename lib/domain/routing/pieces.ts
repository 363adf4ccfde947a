import type { CourseId, OptionId, PrinterId, StationId } from '@/lib/domain/site/ids';
import { kitchenNameOf } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import type { Order, OrderLine } from '@/lib/domain/orders/order';
import type { LineMark, TicketLine, TicketOption } from '@/lib/domain/tickets/ticket';
import type { LineRoute, SplitPart, StationRoute } from './route-line';

/** One line as it goes to one station's printer: the grain that tickets are made of. */
export type Piece = {
  readonly kind: 'cook' | 'split' | 'copy';
  readonly sourceLine: number;
  readonly option: OptionId | null;
  readonly course: CourseId | null;
  readonly station: StationId;
  readonly printer: PrinterId;
  readonly printsFor: { readonly station: string; readonly reason: string } | null;
  readonly line: TicketLine;
};

/** A part of a line that prints nowhere. */
export type Loss = {
  readonly sourceLine: number;
  readonly kind: Piece['kind'];
  readonly option: OptionId | null;
  /** Where it was lost; null when no rule sends it anywhere. */
  readonly station: StationId | null;
};

export type Pieces = { readonly pieces: readonly Piece[]; readonly losses: readonly Loss[] };

/** What was said of a line, of its seat and of the whole table, each once. */
export const allergiesOf = (order: Pick<Order, 'allergies'>, line: OrderLine): readonly string[] => [...new Set([
  ...order.allergies.filter((allergy) => allergy.seat === null || allergy.seat === line.seat).map((allergy) => allergy.words),
  ...line.allergies,
])];

/** Stations whose paper really comes out; a code on a copy never points to a cook who has nothing. */
const printing = (routes: readonly StationRoute[]): readonly StationId[] =>
  routes.flatMap((one) => (one.reached === null || one.printer === null ? [] : [one.reached]));

/** Looks up what pieces need of a site, once for an order. */
export const pieceMaker = (site: Site) => {
  const items = new Map(site.menu.items.map((item) => [item.id, item]));
  const options = new Map(site.menu.options.map((option) => [option.id, option]));
  const stations = new Map(site.stations.map((station) => [station.id, station]));
  const printers = new Map(site.printers.map((printer) => [printer.id, printer.name]));
  const optionName = (option: OptionId): string => {
    const known = options.get(option);
    return known === undefined ? option : kitchenNameOf(known);
  };
  const codesOf = (ids: readonly StationId[]): readonly string[] =>
    [...new Set(ids)].flatMap((id) => stations.get(id) ?? []).toSorted((left, right) => left.position - right.position).map((station) => station.code);

  const printsForOf = (route: StationRoute): Piece['printsFor'] => {
    const tries = route.choice?.tries ?? [];
    const winner = tries.at(-1);
    if (winner === undefined || winner.result !== 'prints') return null;
    const station = stations.get(route.reached ?? route.asked)?.name ?? '';
    if (winner.insteadOf !== null) return { station, reason: `moved from ${printers.get(winner.insteadOf) ?? 'its printer'}` };
    if (winner.backupOf === null) return null;
    const first = tries.find((tried) => tried.printer === winner.backupOf) ?? tries[0];
    const name = printers.get(first?.printer ?? winner.backupOf) ?? 'its printer';
    return { station, reason: first?.result === 'no-reach' ? `${name} is out of reach` : `${name} is down` };
  };

  return (order: Pick<Order, 'allergies'>, line: OrderLine, sourceLine: number, route: LineRoute, marks: readonly LineMark[] = [], quantity = line.quantity): Pieces => {
    const pieces: Piece[] = [];
    const losses: Loss[] = [];
    const item = items.get(line.item);
    const dishName = item === undefined ? line.item : kitchenNameOf(item);
    const course = line.course ?? item?.course ?? null;
    const splits = new Map<OptionId, SplitPart>(route.splits.map((split) => [split.option, split]));
    const splitStations = (option: OptionId): readonly StationId[] => printing(splits.get(option)?.routes ?? []);
    const shared = { sourceLine, quantity, note: line.note, seat: line.seat, allergies: allergiesOf(order, line), marks };

    const optionsAt = (station: StationId, kind: 'cook' | 'copy'): readonly TicketOption[] => line.options.flatMap((option) => {
      const split = splits.get(option);
      if (split === undefined) return [{ name: optionName(option), stationCodes: [] }];
      const codes = codesOf(splitStations(option));
      if (kind === 'copy') return splitStations(option).includes(station) ? [] : [{ name: optionName(option), stationCodes: codes }];
      const here = split.withDish.includes(station);
      return here || split.keep ? [{ name: optionName(option), stationCodes: here ? [] : codes }] : [];
    });

    const add = (kind: Piece['kind'], option: OptionId | null, one: StationRoute, make: (station: StationId) => TicketLine): void => {
      if (one.reached === null || one.printer === null) {
        losses.push({ sourceLine, kind, option, station: one.reached ?? one.asked });
      } else if (!pieces.some((piece) => piece.kind === kind && piece.option === option && piece.station === one.reached)) {
        pieces.push({ kind, sourceLine, option, course, station: one.reached, printer: one.printer, printsFor: printsForOf(one), line: make(one.reached) });
      }
    };

    const cooking = printing(route.cook.routes);
    if (route.cook.routes.length === 0) losses.push({ sourceLine, kind: 'cook', option: null, station: null });
    for (const one of route.cook.routes) {
      add('cook', null, one, (station) => ({ ...shared, name: dishName, options: optionsAt(station, 'cook'), forDish: null, stationCodes: [] }));
    }
    for (const split of route.splits) {
      for (const one of split.routes) {
        if (one.reached !== null && split.withDish.includes(one.reached)) continue;
        add('split', split.option, one, () => ({ ...shared, name: optionName(split.option), options: [], forDish: dishName, stationCodes: [] }));
      }
    }
    for (const copy of route.copies) {
      add('copy', null, copy, (station) => ({ ...shared, name: dishName, options: optionsAt(station, 'copy'), forDish: null, stationCodes: codesOf(cooking) }));
    }
    return { pieces, losses };
  };
};
