import type { Station } from '../site/station';
import { colourWords, kindWords, layoutWords, meshWords } from './station-words';

/** What a person writes down about a station; its place among the others is set by putting them in order. */
export type StationField = Exclude<keyof Station, 'id' | 'version' | 'position'>;

export const stationFieldWords: Readonly<Record<StationField, string>> = {
  name: 'Name', code: 'Code', kind: 'What it does', mesh: 'Mesh', colour: 'Colour', printers: 'Printers', open: 'Now', standIn: 'Stand-in',
  layout: 'Ticket', ticketsPerSending: 'Tickets for each sending', pace: 'Items it can start in 15 minutes',
};

type Named = { readonly id: string; readonly name: string };
/** Where the names of what a station refers to are found. */
export type StationNaming = { readonly stations: readonly Named[]; readonly printers: readonly Named[] };
export type StationDifference = { readonly field: StationField; readonly label: string; readonly from: string; readonly to: string };

const nameIn = (rows: readonly Named[], id: string): string => rows.find((row) => row.id === id)?.name ?? 'one that is gone';

const sayValue = (station: Station, field: StationField, naming: StationNaming): string => {
  switch (field) {
    case 'kind': return kindWords[station.kind];
    case 'mesh': return meshWords[station.mesh];
    case 'colour': return colourWords[station.colour];
    case 'layout': return layoutWords[station.layout];
    case 'open': return station.open ? 'open' : 'closed';
    case 'printers': return station.printers.map((printer) => nameIn(naming.printers, printer)).join(', then ') || 'none';
    case 'standIn': return station.standIn === null ? 'nobody' : nameIn(naming.stations, station.standIn);
    case 'pace': return station.pace === null ? 'not said' : String(station.pace);
    default: return String(station[field]);
  }
};

const fields = Object.keys(stationFieldWords) as readonly StationField[];

/** Every field of a station in words, for somebody who only reads. */
export const stationFacts = (station: Station, naming: StationNaming): readonly { readonly label: string; readonly value: string }[] =>
  fields.map((field) => ({ label: stationFieldWords[field], value: sayValue(station, field, naming) }));

/** The order of the printers counts: it is the order they are tried in. */
const sameValue = (left: unknown, right: unknown): boolean => (Array.isArray(left) && Array.isArray(right) ? left.join('\n') === right.join('\n') : left === right);

/** What differs between two states of one station, in words. */
export const stationDifferences = (from: Station, to: Station, naming: StationNaming): readonly StationDifference[] =>
  fields
    .filter((field) => !sameValue(from[field], to[field]))
    .map((field) => ({ field, label: stationFieldWords[field], from: sayValue(from, field, naming), to: sayValue(to, field, naming) }));

/** One line of history: "Bar closed", "Larder: stand-in nobody to Grill", "Bar closed; printers BAR2 to BAR1". */
export const sayStationChange = (from: Station, to: Station, naming: StationNaming): string => {
  const differences = stationDifferences(from, to, naming);
  const [only] = differences;
  if (only === undefined) return `${to.name} saved without a change`;
  if (differences.length === 1 && only.field === 'name') return `${from.name} renamed to ${to.name}`;
  const shift = from.open === to.open ? null : `${to.name} ${to.open ? 'opened' : 'closed'}`;
  const rest = differences.filter(({ field }) => field !== 'open').map(({ label, from: was, to: now }) => `${label.toLowerCase()} ${was} to ${now}`).join(', ');
  return shift === null ? `${to.name}: ${rest}` : [shift, ...(rest === '' ? [] : [rest])].join('; ');
};
