import 'server-only';
import { decodeFile } from '@/lib/domain/menu-file/decode-file';
import { guessMapping, menuFields, type Mapping } from '@/lib/domain/menu-file/fields';
import { readTable, type Table } from '@/lib/domain/menu-file/read-table';
import { AppError } from '@/lib/http/errors';

/** The table in an uploaded file, or a refusal that says why there is none. */
export const readUpload = (bytes: Uint8Array): Table => {
  const decoded = decodeFile(bytes);
  if (!decoded.ok) throw new AppError('invalid', decoded.message);
  const reading = readTable(decoded.text);
  if (!reading.ok) throw new AppError('invalid', reading.line === null ? reading.message : `Line ${reading.line}: ${reading.message}`);
  return reading.table;
};

const refused = (): AppError => new AppError('invalid', 'The columns cannot be understood. Nothing was changed. Choose them again.');

/** The mapping a person chose, as JSON from field to column; guessed from the headings while nobody has chosen. */
export const readMapping = (text: string | undefined, table: Table): Mapping => {
  if (text === undefined) return guessMapping(table.headings);
  let given: unknown;
  try {
    given = JSON.parse(text);
  } catch {
    throw refused();
  }
  if (typeof given !== 'object' || given === null) throw refused();
  const columns = given as Record<string, unknown>;
  const isColumn = (column: unknown): boolean => column === null || (Number.isInteger(column) && Number(column) >= 0 && Number(column) < table.headings.length);
  if (!menuFields.every((field) => isColumn(columns[field]))) throw refused();
  return Object.fromEntries(menuFields.map((field) => [field, columns[field]])) as Mapping;
};
