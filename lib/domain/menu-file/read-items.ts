import type { Allergen } from '@/lib/domain/site/menu';
import { fieldWords, type Mapping, type MenuField } from './fields';
import { readAllergens, readGroups, type GroupText } from './option-cell';
import type { Table, TableRow } from './read-table';

/** Why a line cannot be taken, and the column that says so. */
export type LineError = { readonly line: number; readonly column: string; readonly reason: string };

/** One line of the file as an item; a field whose column is not in the file is undefined and leaves what is there. */
export type ReadItem = {
  readonly line: number;
  readonly section: string;
  readonly name: string;
  readonly kitchenName?: string;
  readonly course?: string;
  readonly allergens?: readonly Allergen[];
  readonly preparationSeconds?: number | null;
  readonly soldOut?: boolean;
  readonly left?: number | null;
  readonly noTicket?: boolean;
  readonly groups?: readonly GroupText[];
};

const yes = new Set(['yes', 'y', 'true', '1', 'x']);
const not = new Set(['', 'no', 'n', 'false', '0']);
const longestName = 120;

type Reader = { readonly row: TableRow; readonly mapping: Mapping; readonly fail: (field: MenuField, reason: string) => undefined };

const cellOf = ({ row, mapping }: Reader, field: MenuField): string | undefined => {
  const column = mapping[field];
  return column === null ? undefined : (row.cells[column] ?? '').normalize('NFC');
};

const readWords = (reader: Reader, field: MenuField, required: boolean): string | undefined => {
  const cell = cellOf(reader, field);
  if (cell === undefined) return undefined;
  if (required && cell === '') return reader.fail(field, `${fieldWords[field]} is empty.`);
  if (cell.length > longestName) return reader.fail(field, `${fieldWords[field]} has ${cell.length} characters; at most ${longestName} are taken.`);
  return /[\u0000-\u001f\u007f]/.test(cell) ? reader.fail(field, `${fieldWords[field]} has a line break or another control character in it.`) : cell;
};

const readFlag = (reader: Reader, field: MenuField): boolean | undefined => {
  const cell = cellOf(reader, field)?.toLowerCase();
  if (cell === undefined) return undefined;
  if (yes.has(cell)) return true;
  return not.has(cell) ? false : reader.fail(field, `“${cell}” is neither yes nor no.`);
};

const readNumber = (reader: Reader, field: MenuField, most: number): number | null | undefined => {
  const cell = cellOf(reader, field);
  if (cell === undefined) return undefined;
  if (cell === '') return null;
  const value = /^\d{1,6}$/.test(cell) ? Number(cell) : NaN;
  return value <= most ? value : reader.fail(field, `“${cell}” is not a whole number from 0 to ${most}.`);
};

const readSaidAllergens = (reader: Reader): readonly Allergen[] | undefined => {
  const cell = cellOf(reader, 'allergens');
  if (cell === undefined) return undefined;
  const { known, unknown } = readAllergens(cell);
  return unknown.length > 0 ? reader.fail('allergens', `“${unknown.join(', ')}” is no allergen of the list. Nothing is guessed where an allergy is at stake.`) : known;
};

const readItemGroups = (reader: Reader): readonly GroupText[] | undefined => {
  const cell = cellOf(reader, 'options');
  if (cell === undefined) return undefined;
  const reading = readGroups(cell);
  return reading.ok ? reading.groups : reader.fail('options', reading.message);
};

const present = <Key extends string, Value>(key: Key, value: Value | undefined): { readonly [Name in Key]?: Value } =>
  (value === undefined ? {} : { [key]: value }) as { readonly [Name in Key]?: Value };

/** Reads every line; all that is wrong is said at once, and a line with a fault gives no item. */
export const readItems = (table: Table, mapping: Mapping): { readonly items: readonly ReadItem[]; readonly errors: readonly LineError[] } => {
  const errors: LineError[] = [];
  const items = table.rows.flatMap((row): readonly ReadItem[] => {
    const before = errors.length;
    const reader: Reader = {
      row, mapping,
      fail: (field, reason) => {
        errors.push({ line: row.line, column: table.headings[mapping[field] ?? -1] ?? fieldWords[field], reason });
        return undefined;
      },
    };
    const section = readWords(reader, 'section', true);
    const name = readWords(reader, 'name', true);
    const item: ReadItem = {
      line: row.line, section: section ?? '', name: name ?? '',
      ...present('kitchenName', readWords(reader, 'kitchenName', false)), ...present('course', readWords(reader, 'course', false)),
      ...present('allergens', readSaidAllergens(reader)), ...present('preparationSeconds', readNumber(reader, 'preparationSeconds', 86_400)),
      ...present('soldOut', readFlag(reader, 'soldOut')), ...present('left', readNumber(reader, 'left', 100_000)), ...present('noTicket', readFlag(reader, 'noTicket')),
      ...present('groups', readItemGroups(reader)),
    };
    return errors.length === before ? [item] : [];
  });
  return { items, errors };
};
