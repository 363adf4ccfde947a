import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import { suggestCode } from '@/lib/domain/stations/codes';
import type { StationInput } from './schema';

/** What the form of one station needs: itself, its neighbours, and the printers to choose from. */
export type StationView = {
  readonly siteId: string;
  /** Null for a new one. */
  readonly station: Station | null;
  readonly others: readonly Station[];
  readonly printers: readonly { readonly id: string; readonly name: string }[];
  /** Plans whose rules send to it, by name. */
  readonly usedBy: readonly string[];
};

export const viewStation = (site: Site, station: Station | null): StationView => ({
  siteId: site.id, station,
  others: site.stations.filter((one) => one.id !== station?.id),
  printers: site.printers.map(({ id, name }) => ({ id, name })),
  usedBy: station === null ? [] : site.plans.filter((plan) => plan.rules.some((rule) => rule.stations.includes(station.id))).map((plan) => plan.name),
});

export const inputOfStation = (station: Station): StationInput => ({
  name: station.name, code: station.code, kind: station.kind, mesh: station.mesh, colour: station.colour, printers: [...station.printers], open: station.open,
  standIn: station.standIn, layout: station.layout, ticketsPerSending: station.ticketsPerSending, pace: station.pace,
});

export const newStationInput = (others: readonly Station[]): StationInput => ({
  name: '', code: suggestCode('', others) ?? '', kind: 'prep', mesh: 'square', colour: 'brick', printers: [], open: true, standIn: null, layout: 'by-course', ticketsPerSending: 1, pace: null,
});

export const meshWords: Readonly<Record<Station['mesh'], string>> = {
  square: 'Square weave', diagonal: 'Diagonal', dots: 'Dots', bars: 'Bars', diamond: 'Diamond', lines: 'Lines', rings: 'Rings', chevron: 'Chevron', brick: 'Brickwork', grain: 'Grain',
};
export const colourWords: Readonly<Record<Station['colour'], string>> = {
  brick: 'Brick', slate: 'Slate blue', aubergine: 'Aubergine', mustard: 'Mustard', pine: 'Pine', iron: 'Iron', plum: 'Plum', moss: 'Moss', rust: 'Rust', harbour: 'Harbour blue',
};
export const kindWords: Readonly<Record<Station['kind'], string>> = { prep: 'Cooks', pass: 'Checks and sends out' };
export const layoutWords: Readonly<Record<Station['layout'], string>> = { 'by-course': 'Dishes by course', 'by-seat': 'Every seat in turn' };
