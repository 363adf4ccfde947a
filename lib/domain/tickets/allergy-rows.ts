import { cellsOf, padTo } from './cells';
import type { Paper } from './paper';
import { rowOf, run, type Row } from './sheet';
import type { TicketAllergy } from './ticket';
import { wrap } from './wrap';

export const seatWords = (seat: number | null): string => (seat === null ? 'table' : `seat ${seat}`);

const block = (texts: readonly string[], paper: Paper, wide: boolean): readonly Row[] => {
  const pieces = texts.flatMap((text) => wrap(text, paper.columns - 2));
  const cells = wide ? paper.columns - 2 : Math.max(...pieces.map(cellsOf));
  return pieces.map((piece) => rowOf(run(` ${padTo(piece, cells)} `, { emphasis: 'allergy' })));
};

/** For printers with neither inverse nor red: double width inside a drawn box. */
const framed = (texts: readonly string[], paper: Paper): readonly Row[] => {
  const { top, bottom, side, edge } = paper.frame;
  const inner = Math.floor((paper.columns - 2) / 2);
  const line = (corners: readonly [string, string]): Row => rowOf(run(corners[0] + edge.repeat(inner * 2) + corners[1], { emphasis: 'allergy' }));
  const wall = run(side, { emphasis: 'allergy' });
  const pieces = texts.flatMap((text) => wrap(text, inner));
  return [line(top), ...pieces.map((piece) => rowOf(wall, run(padTo(piece, inner), { emphasis: 'allergy', width: 2 }), wall)), line(bottom)];
};

const allergyRows = (texts: readonly string[], paper: Paper, wide: boolean): readonly Row[] => {
  if (texts.length === 0) return [];
  return paper.emphasis === 'frame' ? framed(texts, paper) : block(texts, paper, wide);
};

/** Again at the line itself, since a line is read without its head. */
export const lineAllergyRows = (allergies: readonly string[], paper: Paper): readonly Row[] =>
  allergyRows([...new Set(allergies.map((words) => paper.words(words)))], paper, false);

/** The table first, then each seat, with everything said of it. */
export const headAllergyRows = (allergies: readonly TicketAllergy[], paper: Paper): readonly Row[] => {
  const seats = [...new Set(allergies.map(({ seat }) => seat))].toSorted((left, right) => (left ?? 0) - (right ?? 0));
  return seats.flatMap((seat) => {
    const said = allergies.filter((allergy) => allergy.seat === seat).map(({ words }) => paper.words(words));
    return allergyRows([`ALLERGY ${seatWords(seat)}`, ...new Set(said)], paper, true);
  });
};
