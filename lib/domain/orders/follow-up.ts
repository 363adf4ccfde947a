import { printerPlaces, type PrinterPlace } from '@/lib/domain/routing/choose-printer';
import { pieceMaker, type Loss, type Piece } from '@/lib/domain/routing/pieces';
import type { Routing } from '@/lib/domain/routing/routing';
import type { PrinterId, TillId } from '@/lib/domain/site/ids';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { LineMark } from '@/lib/domain/tickets/ticket';
import type { SaidAllergy } from './order';
import { quantityLeft, type PrintedPart, type TabLine } from './tab';

export type FollowUp = { readonly pieces: readonly Piece[]; readonly losses: readonly Loss[] };

type Reaches = (till: TillId, printer: PrinterId) => boolean;

/** The printer that a line is on, or whoever prints for it now: its divert, then its backups. */
export const printerNow = (site: Site, present: Present, reaches: Reaches, printer: PrinterId, till: TillId): PrinterPlace | null => {
  const backups = new Map(site.printers.map((one) => [one.id, one.backup]));
  const diverts = new Map(present.diverts.flatMap((divert) => (divert.kind === 'printer' ? [[divert.from, divert.to] as const] : [])));
  const works = (id: PrinterId): boolean => !present.downPrinters.includes(id) && reaches(till, id);
  return printerPlaces([printer], backups, diverts).find((place) => works(place.printer)) ?? null;
};

const printsFor = (site: Site, part: PrintedPart, place: PrinterPlace): Piece['printsFor'] => {
  if (place.printer === part.printer) return null;
  const station = site.stations.find((one) => one.id === part.station)?.name ?? '';
  const name = site.printers.find((one) => one.id === part.printer)?.name ?? '';
  return { station, reason: place.insteadOf === null ? `${name} is down` : `moved from ${name}` };
};

/**
 * Prints word of a line exactly where the line printed. What the plan says by now does not matter; a printer that is out
 * is followed to its divert or backups, and what nobody prints is reported lost.
 */
export const followUp = (
  site: Site, routing: Routing, reaches: Reaches, allergies: readonly SaidAllergy[],
  sent: TabLine, index: number, till: TillId, marks: readonly LineMark[], quantity = quantityLeft(sent),
): FollowUp => {
  if (sent.route === null) return { pieces: [], losses: [] };
  const made = pieceMaker(site)({ allergies }, sent.line, index, sent.route, sent.held ? [...marks, 'HOLD'] : marks, quantity);
  const pieces: Piece[] = [];
  const losses: Loss[] = [];
  for (const part of sent.printed) {
    const original = made.pieces.find((piece) => piece.kind === part.kind && piece.option === part.option && piece.station === part.station);
    const place = printerNow(site, routing.present, reaches, part.printer, till);
    if (place === null || original === undefined) losses.push({ sourceLine: index, kind: part.kind, option: part.option, station: part.station });
    else pieces.push({ ...original, printer: place.printer, printsFor: printsFor(site, part, place) });
  }
  return { pieces, losses };
};
