import { cellsOf, padTo } from './cells';
import { isInCodePage } from './code-pages';
import { printable, type LetterCase } from './printable';
import { rowOf, run, type Row, type Run } from './sheet';
import type { PaperPrinter } from './ticket';
import { wrap } from './wrap';

/** Narrower than any roll's, so that every part of a ticket still has a cell to stand in. */
const fewestColumns = 10;

export const columnsOf = (printer: Pick<PaperPrinter, 'columns'>): number => Math.max(fewestColumns, Math.floor(printer.columns));

/** One printer's paper, as the parts of the layout write on it. */
export type Paper = {
  readonly columns: number;
  readonly emphasis: PaperPrinter['emphasis'];
  /** Corners and edges of a frame: drawn where the code page has them, else plain signs. */
  readonly frame: { readonly top: readonly [string, string]; readonly bottom: readonly [string, string]; readonly side: string; readonly edge: string };
  readonly words: (text: string, letterCase?: LetterCase) => string;
};

const drawnFrame: Paper['frame'] = { top: ['┌', '┐'], bottom: ['└', '┘'], side: '│', edge: '─' };
const plainFrame: Paper['frame'] = { top: ['+', '+'], bottom: ['+', '+'], side: '|', edge: '-' };

export const paperOf = (printer: PaperPrinter): Paper => ({
  columns: columnsOf(printer),
  emphasis: printer.emphasis,
  frame: isInCodePage('┌┐└┘│─', printer.codePage) ? drawnFrame : plainFrame,
  words: (text, letterCase = 'capitals') => printable(text, printer.codePage, letterCase).text,
});

export const divider = (paper: Paper): Row => rowOf(run('-'.repeat(paper.columns)));

/** Words wrapped over as many rows as they need, each indented alike. */
export const wrappedRows = (text: string, indent: number, paper: Paper, more: Partial<Omit<Run, 'text'>> = {}): readonly Row[] => {
  const cells = Math.floor(paper.columns / (more.width ?? 1)) - indent;
  return wrap(text, cells).map((piece) => rowOf(run(' '.repeat(indent)), run(piece, more)));
};

/** Left words wrapped beside what stands at the right end of the first row; below it where the two do not fit. */
export const spreadRows = (left: string, right: string, paper: Paper, more: Partial<Omit<Run, 'text'>> = {}): readonly Row[] => {
  const room = paper.columns - cellsOf(right) - 1;
  const tooNarrow = room < Math.min(cellsOf(left), Math.floor(paper.columns / 3));
  if (right === '' || tooNarrow) return [...wrappedRows(left, 0, paper, more), ...wrappedRows(right, 0, paper, more)];
  const [first = '', ...rest] = wrap(left, room);
  return [rowOf(run(`${padTo(first, room)} ${right}`, more)), ...rest.map((piece) => rowOf(run(piece, more)))];
};
