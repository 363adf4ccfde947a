import type { Emphasis } from '@/lib/domain/site/printer';

/** `allergy` is kept for allergies and nothing else; how it looks is the printer's. */
export type RunEmphasis = 'none' | 'bold' | 'allergy';

/** Words printed alike, side by side with the next run of the row. */
export type Run = {
  readonly text: string;
  readonly emphasis: RunEmphasis;
  /** In cells of one letter: 2 is double width. */
  readonly width: 1 | 2;
  readonly height: 1 | 2;
  /** The order's lines that these words are the name of; empty for everything else. */
  readonly sourceLines: readonly number[];
};

export type Row = { readonly runs: readonly Run[] };

export type TicketPage = { readonly rows: readonly Row[] };

/** A ticket on its grid: the picture on screen and the bytes on the wire are both made from this. */
export type TicketSheet = {
  /** Cells in a row. */
  readonly columns: number;
  readonly emphasis: Emphasis;
  readonly pages: readonly TicketPage[];
  /** How many times all pages come out. */
  readonly times: number;
};

export const run = (text: string, more: Partial<Omit<Run, 'text'>> = {}): Run => ({
  text, emphasis: 'none', width: 1, height: 1, sourceLines: [], ...more,
});

export const rowOf = (...runs: readonly Run[]): Row => ({ runs: runs.filter(({ text }) => text !== '') });

/** Height in ordinary rows of text. */
export const heightOf = (rows: readonly Row[]): number =>
  rows.reduce((height, row) => height + Math.max(1, ...row.runs.map((each) => each.height)), 0);
