import { CsvError, parse } from 'csv-parse/sync';
import { restore } from './safe-cell';

/** One record of the file and the line it starts on, counted from 1. */
export type TableRow = { readonly line: number; readonly cells: readonly string[] };
export type Table = { readonly delimiter: string; readonly headings: readonly string[]; readonly rows: readonly TableRow[] };
export type TableReading = { readonly ok: true; readonly table: Table } | { readonly ok: false; readonly line: number | null; readonly message: string };

const delimiters = [',', ';', '\t'] as const;

/** The delimiter that stands most often outside quotes in the first line; a comma when none does. */
export const findDelimiter = (text: string): string => {
  const counts = new Map<string, number>();
  let quoted = false;
  for (const character of text.slice(0, 20_000)) {
    if (character === '"') quoted = !quoted;
    else if (!quoted && (character === '\n' || character === '\r')) break;
    else if (!quoted && (delimiters as readonly string[]).includes(character)) counts.set(character, (counts.get(character) ?? 0) + 1);
  }
  return [...delimiters].toSorted((left, right) => (counts.get(right) ?? 0) - (counts.get(left) ?? 0))[0] ?? ',';
};

const words: Readonly<Record<string, string>> = {
  CSV_QUOTE_NOT_CLOSED: 'A quoted cell starts here and never ends. Add the closing quote, then choose the file again.',
  CSV_INVALID_CLOSING_QUOTE: 'There is text after a closing quote. A quote inside a cell is written twice.',
  INVALID_OPENING_QUOTE: 'There is a quote in the middle of a cell that is not quoted. Quote the whole cell and write the inner quote twice.',
};

type Parsed = { readonly record: readonly string[]; readonly info: { readonly lines: number } };

/** Splits a text into rows as RFC 4180 says, with any of three delimiters; empty lines count for numbers and nothing else. */
export const readTable = (text: string): TableReading => {
  const delimiter = findDelimiter(text);
  let parsed: readonly Parsed[];
  try {
    parsed = parse(text, { delimiter, info: true, relax_column_count: true, skip_empty_lines: true, max_record_size: 1_000_000 }) as unknown as Parsed[];
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    return { ok: false, line: typeof error['lines'] === 'number' ? error['lines'] : null, message: words[error.code] ?? 'This line cannot be split into cells. Open the file in a text editor and look at it.' };
  }
  const [head, ...rest] = parsed.map(({ record, info }) => ({ cells: record.map((cell) => restore(cell).trim()), last: info.lines }));
  if (head === undefined) return { ok: false, line: null, message: 'The file has no lines. Choose the one that has the menu in it.' };
  const starts = parsed.map(({ record, info }) => info.lines - record.reduce((sum, cell) => sum + (cell.match(/\r\n|\r|\n/g)?.length ?? 0), 0));
  return { ok: true, table: { delimiter, headings: head.cells, rows: rest.map(({ cells }, index) => ({ line: starts[index + 1] ?? index + 2, cells })) } };
};
