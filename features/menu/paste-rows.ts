import type { ItemInput } from './schema';

/** The columns that can be pasted into, in the order they stand. */
export const pasteColumns = ['name', 'kitchenName', 'course', 'preparationSeconds', 'left'] as const;
export type PasteColumn = (typeof pasteColumns)[number];

export type Courses = readonly { readonly id: string; readonly name: string }[];

const setCell = (item: ItemInput, column: PasteColumn, text: string, courses: Courses): ItemInput => {
  const value = text.trim();
  switch (column) {
    case 'name': return value === '' ? item : { ...item, name: value };
    case 'kitchenName': return { ...item, kitchenName: value };
    case 'course': return { ...item, course: courses.find((course) => course.name.toLowerCase() === value.toLowerCase())?.id ?? item.course };
    case 'preparationSeconds': return /^\d{1,5}$/.test(value) ? { ...item, preparationSeconds: Number(value) } : item;
    case 'left': return /^\d{1,6}$/.test(value) ? { ...item, left: Number(value) } : value === '' ? { ...item, left: null } : item;
  }
};

/** A pasted block as rows of cells; null when it is a single cell, which the text box takes by itself. */
export const readBlock = (text: string): readonly (readonly string[])[] | null => {
  const lines = text.replace(/\r\n?/g, '\n').replace(/\n+$/, '').split('\n');
  return lines.length === 1 && !text.includes('\t') ? null : lines.map((line) => line.split('\t'));
};

export type PasteResult = { readonly updates: readonly { readonly index: number; readonly input: ItemInput }[]; readonly creates: readonly ItemInput[] };

/** Lays a pasted block over the lines from one cell on; what reaches past the last line becomes new lines with a name. */
export const pasteBlock = (items: readonly ItemInput[], at: { readonly row: number; readonly column: PasteColumn }, block: readonly (readonly string[])[], blank: ItemInput, courses: Courses): PasteResult => {
  const first = pasteColumns.indexOf(at.column);
  const fill = (item: ItemInput, cells: readonly string[]): ItemInput =>
    cells.reduce((filled, cell, offset) => {
      const column = pasteColumns[first + offset];
      return column === undefined ? filled : setCell(filled, column, cell, courses);
    }, item);
  const updates = block.flatMap((cells, offset) => {
    const index = at.row + offset;
    const item = items[index];
    if (item === undefined) return [];
    const input = fill(item, cells);
    return JSON.stringify(input) === JSON.stringify(item) ? [] : [{ index, input }];
  });
  const creates = block.slice(Math.max(0, items.length - at.row)).map((cells) => fill(blank, cells)).filter((item) => item.name !== '');
  return { updates, creates };
};
