import { lineAllergyRows } from './allergy-rows';
import { cellsOf, padTo } from './cells';
import { portionWords, type Entry } from './merge-lines';
import { wrappedRows, type Paper } from './paper';
import { rowOf, run, type Row, type Run } from './sheet';
import { wrap } from './wrap';

/** Where the seat stands: under the dish, before it (the pass counts plates by seat), or in a heading above. */
export type SeatPlace = 'under' | 'before' | 'above';

/** A name with the codes of its stations at the right edge; the rows after the first hang under its first letter. */
const namedRows = (lead: string, name: string, codes: string, paper: Paper, more: Partial<Omit<Run, 'text'>>, outlined: string): readonly Row[] => {
  const hang = cellsOf(lead);
  const room = paper.columns - hang - (codes === '' ? 0 : cellsOf(codes) + 1);
  const beside = room >= Math.min(cellsOf(name), 6);
  const [first = '', ...rest] = wrap(name, beside ? room : paper.columns - hang);
  const runs = [
    run(lead.slice(0, hang - cellsOf(outlined)), { ...more, sourceLines: [] }),
    run(outlined + first, more),
    ...(beside && codes !== '' ? [run(padTo('', room - cellsOf(first) + 1)), run(codes)] : []),
  ];
  const below = beside || codes === '' ? [] : wrappedRows(codes, hang, paper);
  return [rowOf(...runs), ...rest.map((piece) => rowOf(run(' '.repeat(hang)), run(piece, more))), ...below];
};

/** "2 ", or for one plate of one seat at the pass "s2 ". */
const leadOf = (entry: Entry, place: SeatPlace): { readonly text: string; readonly seatTold: boolean } => {
  const [portion] = entry.portions;
  if (place !== 'before' || portion === undefined || portion.seat === null) return { text: `${entry.quantity} `, seatTold: place === 'above' };
  return { text: entry.quantity === 1 ? `s${portion.seat} ` : `s${portion.seat} ${entry.quantity} `, seatTold: true };
};

/** One dish, or one split option: quantity and name, its options, for which dish, the note, its allergies, the seat. */
export const lineRows = (entry: Entry, paper: Paper, place: SeatPlace): readonly Row[] => {
  const lead = leadOf(entry, place);
  const hang = cellsOf(lead.text);
  const marks = entry.marks.length === 0 ? '' : `${entry.marks.join(' ')}: `;
  const emphasis = marks === '' ? 'none' : 'bold';
  return [
    ...namedRows(lead.text, marks + paper.words(entry.name), entry.stationCodes.join(' '), paper,
      { emphasis, sourceLines: entry.sourceLines }, place === 'before' ? '' : lead.text),
    ...entry.options.flatMap((option) => namedRows(' '.repeat(hang + 2), paper.words(option.name), option.stationCodes.join(' '), paper, {}, '')),
    ...(entry.forDish === null ? [] : wrappedRows(`for ${paper.words(entry.forDish)}`, hang, paper)),
    ...wrappedRows(paper.words(entry.note), hang + 2, paper),
    ...lineAllergyRows(entry.allergies, paper),
    ...(lead.seatTold ? [] : wrappedRows(portionWords(entry.portions), hang, paper)),
  ];
};
