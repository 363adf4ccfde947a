import { asId } from '@/lib/domain/site/ids';
import type { Station } from '@/lib/domain/site/station';

type StationRow = Pick<Station, 'name' | 'code' | 'kind' | 'mesh' | 'colour' | 'pace'> & { readonly printers: readonly string[]; readonly standIn?: string; readonly layout?: Station['layout'] };

/**
 * Codes differ from each other in both letters, so that one smudged letter on a ticket still names the station. That rules out
 * BR beside GR and PA beside PY: the bar is BA by its first letters, and the pass is EX, for the expediter who calls there.
 */
const rows: readonly StationRow[] = [
  { name: 'Grill', code: 'GR', kind: 'prep', mesh: 'square', colour: 'brick', printers: ['grill1'], standIn: 'sauce', pace: 24 },
  { name: 'Larder', code: 'LD', kind: 'prep', mesh: 'diagonal', colour: 'slate', printers: ['larder1'], pace: 30 },
  { name: 'Sauce', code: 'SC', kind: 'prep', mesh: 'dots', colour: 'aubergine', printers: ['sauce1'], standIn: 'grill', pace: 28 },
  { name: 'Pastry', code: 'PY', kind: 'prep', mesh: 'bars', colour: 'mustard', printers: ['pastry1'], standIn: 'larder', pace: 20 },
  { name: 'Bar', code: 'BA', kind: 'prep', mesh: 'diamond', colour: 'pine', printers: ['bar2', 'bar1'], pace: 40 },
  { name: 'Pass', code: 'EX', kind: 'pass', mesh: 'lines', colour: 'iron', printers: ['pass1'], layout: 'by-seat', pace: null },
];

/** Only the Terrace till reaches BAR2, so that everybody else's drinks come out on BAR1. */
export const stations: readonly Station[] = rows.map(({ printers, standIn, layout = 'by-course', ...row }, position) => ({
  ...row, id: asId(row.name.toLowerCase()), position, printers: printers.map((printer) => asId(printer)), open: true,
  standIn: standIn === undefined ? null : asId(standIn), layout, ticketsPerSending: 1, version: 1,
}));
