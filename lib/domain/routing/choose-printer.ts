import type { PrinterId, StationId, TillId } from '@/lib/domain/site/ids';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';

/** One printer that a station's tickets may come out of, in the order they are tried. */
export type PrinterPlace = {
  readonly printer: PrinterId;
  /** The printer it stands for as a backup; null for the station's own. */
  readonly backupOf: PrinterId | null;
  /** The printer whose place a divert gave it; null when nobody diverted. */
  readonly insteadOf: PrinterId | null;
};

export type PrinterTry = PrinterPlace & { readonly result: 'prints' | 'down' | 'no-reach' };

export type PrinterChoice = {
  readonly station: StationId;
  readonly tries: readonly PrinterTry[];
  /** Null when all are out: the line is lost at this station. */
  readonly printer: PrinterId | null;
};

const divertedPrinter = (printer: PrinterId, diverts: ReadonlyMap<PrinterId, PrinterId>): PrinterId => {
  const seen = new Set<PrinterId>();
  let place = printer;
  for (let next = diverts.get(place); next !== undefined && !seen.has(next); next = diverts.get(place)) {
    seen.add(place);
    place = next;
  }
  return place;
};

/**
 * A station's own printers in order, then each one's backups in that order, each tried once. A printer divert
 * puts its target in its source's place, and the target's backups follow it there.
 */
export const printerPlaces = (
  own: readonly PrinterId[],
  backups: ReadonlyMap<PrinterId, PrinterId | null>,
  diverts: ReadonlyMap<PrinterId, PrinterId>,
): readonly PrinterPlace[] => {
  const places = new Map<PrinterId, PrinterPlace>();
  const place = (asked: PrinterId, backupOf: PrinterId | null): PrinterId => {
    const printer = divertedPrinter(asked, diverts);
    if (!places.has(printer)) places.set(printer, { printer, backupOf, insteadOf: printer === asked ? null : asked });
    return printer;
  };
  const starts = own.map((printer) => place(printer, null));
  for (const start of starts) {
    const seen = new Set<PrinterId>([start]);
    let backup = backups.get(start) ?? null;
    while (backup !== null && !seen.has(backup)) {
      seen.add(backup);
      backup = backups.get(place(backup, start)) ?? null;
    }
  }
  return [...places.values()];
};

export type Reaches = (till: TillId, printer: PrinterId) => boolean;

/** Chooses for a station and a till the first printer that is up and that the till reaches. */
export const printerChooser = (site: Pick<Site, 'stations' | 'printers'>, present: Present, reaches: Reaches) => {
  const backups = new Map(site.printers.map((printer) => [printer.id, printer.backup]));
  const down = new Set(present.downPrinters);
  const diverts = new Map(present.diverts.flatMap((divert) => (divert.kind === 'printer' ? [[divert.from, divert.to] as const] : [])));
  const places = new Map(site.stations.map((station) => [station.id, printerPlaces(station.printers, backups, diverts)]));
  const resultOf = (till: TillId, printer: PrinterId): PrinterTry['result'] =>
    down.has(printer) ? 'down' : reaches(till, printer) ? 'prints' : 'no-reach';

  return {
    /** The printer alone, for speed. */
    printerFor: (station: StationId, till: TillId): PrinterId | null =>
      places.get(station)?.find((place) => resultOf(till, place.printer) === 'prints')?.printer ?? null,
    /** Every try up to the one that prints, for the explanation. */
    choose: (station: StationId, till: TillId): PrinterChoice => {
      const tries: PrinterTry[] = [];
      for (const place of places.get(station) ?? []) {
        const result = resultOf(till, place.printer);
        tries.push({ ...place, result });
        if (result === 'prints') return { station, tries, printer: place.printer };
      }
      return { station, tries, printer: null };
    },
  };
};
