import type { PrinterId, StationId } from './ids';

export const stationKinds = ['prep', 'pass'] as const;
export type StationKind = (typeof stationKinds)[number];
/** The weave that frames a station's stamp: known without colour. */
export const meshes = ['square', 'diagonal', 'dots', 'bars', 'diamond', 'lines', 'rings', 'chevron', 'brick', 'grain'] as const;
export type Mesh = (typeof meshes)[number];
export const stationColours = ['brick', 'slate', 'aubergine', 'mustard', 'pine', 'iron', 'plum', 'moss', 'rust', 'harbour'] as const;
export type StationColour = (typeof stationColours)[number];
/** How a ticket is laid out: dishes by course, or every seat in turn. */
export const ticketLayouts = ['by-course', 'by-seat'] as const;
export type TicketLayout = (typeof ticketLayouts)[number];

/** Where work is done (`prep`), or where orders are checked and sent out (`pass`). */
export type Station = {
  readonly id: StationId;
  readonly name: string;
  /** Two letters, each different from every other station's letter in that place. */
  readonly code: string;
  readonly kind: StationKind;
  readonly mesh: Mesh;
  readonly colour: StationColour;
  readonly position: number;
  /** In the order they are tried. */
  readonly printers: readonly PrinterId[];
  readonly open: boolean;
  readonly standIn: StationId | null;
  readonly layout: TicketLayout;
  /** 1 to 3. */
  readonly ticketsPerSending: number;
  /** Items it can start in 15 minutes; null when nobody has said. */
  readonly pace: number | null;
  readonly version: number;
};
