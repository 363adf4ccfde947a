import { cellsOf, graphemesOf } from './cells';

/** Pieces of at most so many cells; a grapheme wider than that still gets a piece of its own. */
const breakWord = (word: string, cells: number): readonly string[] => {
  const pieces: string[] = [];
  let piece = '';
  for (const grapheme of graphemesOf(word)) {
    if (piece !== '' && cellsOf(piece + grapheme) > cells) {
      pieces.push(piece);
      piece = '';
    }
    piece += grapheme;
  }
  return [...pieces, piece];
};

const wordsOf = (text: string): readonly string[] => text.split(' ').filter((word) => word !== '');

/**
 * Rows of at most so many cells, broken between words; only a word longer than a row is broken inside. Text that fits
 * keeps its spacing; none makes no row.
 */
export const wrap = (text: string, cells: number): readonly string[] => {
  const width = Math.max(1, cells);
  if (text !== '' && cellsOf(text) <= width) return [text];
  const rows: string[] = [];
  for (const word of wordsOf(text)) {
    const last = rows.at(-1);
    if (last !== undefined && cellsOf(last) + 1 + cellsOf(word) <= width) rows[rows.length - 1] = `${last} ${word}`;
    else rows.push(...breakWord(word, width));
  }
  return rows;
};

/** The words that fit on no row whole. */
export const wordsBroken = (text: string, cells: number): readonly string[] =>
  wordsOf(text).filter((word) => cellsOf(word) > cells);
