/**
 * The figures as a table for a terminal.
 * @param {ReadonlyArray<{ name: string, value: number, unit: string, goal: string, holds: boolean }>} figures
 */
export function tableOf(figures) {
  const rows = figures.map(({ name, value, unit, goal, holds }) => [name, readable(value), unit, goal, holds ? 'holds' : 'MISSED']);
  const all = [['figure', 'value', 'unit', 'goal', ''], ...rows];
  const widths = all[0].map((_, column) => Math.max(...all.map((row) => row[column].length)));
  const lineOf = (row) => row.map((cell, column) => (column === 1 ? cell.padStart(widths[column]) : cell.padEnd(widths[column]))).join('  ').trimEnd();
  return all.map(lineOf).join('\n');
}

const readable = (value) => value.toLocaleString('en', { maximumFractionDigits: value < 100 ? 2 : 0 });
