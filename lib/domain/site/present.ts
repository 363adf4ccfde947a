import type { ItemId, PrinterId, SectionId, StationId, TillId } from './ids';
import type { Site } from './site';

/** A temporary change during service. */
export type Divert =
  | { readonly kind: 'section'; readonly section: SectionId; readonly to: readonly StationId[] }
  | { readonly kind: 'item'; readonly item: ItemId; readonly to: readonly StationId[] }
  | { readonly kind: 'station'; readonly from: StationId; readonly to: StationId }
  | { readonly kind: 'printer'; readonly from: PrinterId; readonly to: PrinterId };

/** What is shut, down, off or diverted at one moment. */
export type Present = {
  readonly closedStations: readonly StationId[];
  readonly downPrinters: readonly PrinterId[];
  readonly offTills: readonly TillId[];
  readonly diverts: readonly Divert[];
};

/** Every station open, every printer up, no diverts: the state the plan proof assumes. */
export const allWell: Present = { closedStations: [], downPrinters: [], offTills: [], diverts: [] };

/** What the site's own rows say of the present. */
export const presentOf = (site: Site, diverts: readonly Divert[] = []): Present => ({
  closedStations: site.stations.filter((station) => !station.open).map((station) => station.id),
  downPrinters: site.printers.filter((printer) => printer.downSince !== null).map((printer) => printer.id),
  offTills: [],
  diverts,
});
