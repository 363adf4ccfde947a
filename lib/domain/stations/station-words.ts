import type { Mesh, StationColour, StationKind, TicketLayout } from '../site/station';

export const kindWords: Readonly<Record<StationKind, string>> = { prep: 'Cooks', pass: 'Checks and sends out' };

export const layoutWords: Readonly<Record<TicketLayout, string>> = { 'by-course': 'Dishes by course', 'by-seat': 'Every seat in turn' };

export const meshWords: Readonly<Record<Mesh, string>> = {
  square: 'Square weave', diagonal: 'Diagonal', dots: 'Dots', bars: 'Bars', diamond: 'Diamond', lines: 'Lines', rings: 'Rings', chevron: 'Chevron', brick: 'Brickwork', grain: 'Grain',
};

export const colourWords: Readonly<Record<StationColour, string>> = {
  brick: 'Brick', slate: 'Slate blue', aubergine: 'Aubergine', mustard: 'Mustard', pine: 'Pine', iron: 'Iron', plum: 'Plum', moss: 'Moss', rust: 'Rust', harbour: 'Harbour blue',
};

/** "Dishes by course, twice". */
export const ticketWords = (layout: TicketLayout, ticketsPerSending: number): string =>
  [layoutWords[layout], ...(ticketsPerSending === 1 ? [] : [ticketsPerSending === 2 ? 'twice' : 'three times'])].join(', ');
