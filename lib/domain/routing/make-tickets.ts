import type { CourseId, StationId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import type { Ticket, TicketAllergy, TicketCourse, TicketLine } from '@/lib/domain/tickets/ticket';
import type { Piece } from './pieces';

/** What every ticket of one sending says at its head. */
export type TicketHead = Pick<Ticket, 'event' | 'table' | 'covers' | 'orderType' | 'till' | 'server' | 'orderNumber' | 'sending' | 'time'>;

const groupBy = <Value>(values: readonly Value[], keyOf: (value: Value) => string): readonly (readonly Value[])[] => {
  const groups = new Map<string, Value[]>();
  for (const value of values) {
    const key = keyOf(value);
    const group = groups.get(key);
    if (group === undefined) groups.set(key, [value]);
    else group.push(value);
  }
  return [...groups.values()];
};

const allergiesAtHead = (lines: readonly TicketLine[], tableWide: ReadonlySet<string>): readonly TicketAllergy[] => {
  const seen = new Set<string>();
  const said = lines.flatMap((line) => line.allergies.map((words): TicketAllergy => ({ seat: tableWide.has(words) ? null : line.seat, words })));
  return said
    .filter(({ seat, words }) => {
      const key = `${seat ?? ''} ${words}`;
      return seen.has(key) ? false : seen.add(key) && true;
    })
    .toSorted((left, right) => (left.seat ?? 0) - (right.seat ?? 0));
};

const uniqueOptions = (pieces: readonly Piece[]): TicketLine['options'] => {
  const seen = new Map(pieces.flatMap((piece) => piece.line.options.map((option) => [option.name, option] as const)));
  return [...seen.values()];
};

/** An option that stands on the ticket as a line of its own is not said again under its dish. */
const withoutSplitOptions = (pieces: readonly Piece[]): readonly Piece[] => {
  const own = new Set(pieces.filter((piece) => piece.kind === 'split').map((piece) => `${piece.sourceLine} ${piece.line.name}`));
  if (own.size === 0) return pieces;
  return pieces.map((piece) => (piece.kind === 'split' ? piece : {
    ...piece, line: { ...piece.line, options: piece.line.options.filter((option) => !own.has(`${piece.sourceLine} ${option.name}`)) },
  }));
};

/** On a joined ticket a line stands once, with the codes of all its stations; cooking goes before copying. */
const joinLines = (pieces: readonly Piece[], codeOf: (station: StationId) => string): readonly Piece[] =>
  withoutSplitOptions(groupBy(pieces, (piece) => `${piece.sourceLine} ${piece.option ?? ''}`).map((same) => {
    const cooked = same.filter((piece) => piece.kind !== 'copy');
    const shown = cooked.length > 0 ? cooked : same;
    const first = shown[0]!;
    const codes = first.kind === 'copy' ? first.line.stationCodes : [...new Set(shown.map((piece) => codeOf(piece.station)))];
    return { ...first, line: { ...first.line, options: uniqueOptions(shown), stationCodes: codes } };
  }));

/**
 * Gathers pieces into tickets: one printer, one station, one sending; stations that share a printer stay apart unless
 * it joins them. Printers by name, then stations by position: same pieces, same tickets, always.
 */
export const makeTickets = (site: Site, pieces: readonly Piece[], head: TicketHead, tableAllergies: readonly string[]): readonly Ticket[] => {
  const printers = new Map(site.printers.map((printer) => [printer.id, printer]));
  const stations = new Map(site.stations.map((station) => [station.id, station]));
  const courseOrder = new Map(site.courses.map((course, index) => [course.id, index]));
  const courseNames = new Map(site.courses.map((course) => [course.id, course.name]));
  const tableWide = new Set(tableAllergies);
  const stationOf = (id: StationId): Station => stations.get(id)!;

  const coursesOf = (own: readonly Piece[]): readonly TicketCourse[] => {
    const rank = (course: CourseId | null): number => (course === null ? Infinity : courseOrder.get(course) ?? Infinity);
    return groupBy(own.toSorted((left, right) => rank(left.course) - rank(right.course) || left.sourceLine - right.sourceLine), (piece) => piece.course ?? '')
      .map((same) => ({ course: same[0]!.course === null ? '' : courseNames.get(same[0]!.course) ?? '', lines: same.map((piece) => piece.line) }));
  };

  const cooksWith = (own: readonly Piece[]): readonly string[] => {
    const courses = new Set(own.filter((piece) => piece.kind !== 'copy').map((piece) => piece.course));
    const here = new Set(own.map((piece) => piece.station));
    const others = pieces.filter((piece) => piece.kind !== 'copy' && courses.has(piece.course) && !here.has(piece.station)).map((piece) => stationOf(piece.station));
    return [...new Set(others)].filter((station) => station.kind === 'prep').toSorted((left, right) => left.position - right.position).map((station) => station.name);
  };

  const groups = groupBy(pieces, (piece) => {
    const joins = printers.get(piece.printer)?.joinsStations ?? false;
    return [piece.printer, joins ? '' : piece.station, piece.printsFor?.reason ?? ''].join('|');
  });

  return groups
    .map((own): { readonly ticket: Ticket; readonly position: number } => {
      const printer = printers.get(own[0]!.printer)!;
      const served = [...new Set(own.map((piece) => piece.station))].map(stationOf).toSorted((left, right) => left.position - right.position);
      const allCopies = own.every((piece) => piece.kind === 'copy');
      const joined = printer.joinsStations ? joinLines(own, (station) => stationOf(station).code) : own;
      const shown = joined.map((piece) => (piece.kind === 'copy' && !allCopies ? { ...piece, line: { ...piece.line, marks: ['COPY' as const, ...piece.line.marks] } } : piece));
      const ticket: Ticket = {
        ...head,
        printer: printer.id,
        printerName: printer.name,
        stations: served.map(({ id, code, name }) => ({ id, code, name })),
        copy: allCopies,
        printsFor: own[0]!.printsFor,
        layout: served[0]!.layout,
        allergies: allergiesAtHead(shown.map((piece) => piece.line), tableWide),
        courses: coursesOf(shown),
        cooksWith: cooksWith(own),
        times: Math.max(...served.map((station) => station.ticketsPerSending)),
      };
      return { ticket, position: served[0]!.position };
    })
    .toSorted((left, right) => (left.ticket.printerName < right.ticket.printerName ? -1 : left.ticket.printerName > right.ticket.printerName ? 1 : left.position - right.position))
    .map(({ ticket }) => ticket);
};
