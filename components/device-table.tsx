import type { ReactNode } from 'react';
import styles from './device-table.module.css';

export type DeviceRow = {
  readonly id: string;
  /** The row's own name, in its first cell. */
  readonly name: ReactNode;
  readonly cells: readonly ReactNode[];
  /** What is wrong with it, under the row. */
  readonly findings: ReactNode | null;
};

type DeviceTableProps = { readonly caption: string; readonly columns: readonly string[]; readonly rows: readonly DeviceRow[] };

/** A table that folds each row into a card on a phone; what is wrong stands under the row it is about. */
export function DeviceTable({ caption, columns, rows }: DeviceTableProps) {
  const [first, ...others] = columns;
  return (
    <table className={styles['table']}>
      <caption className="sr-only">{caption}</caption>
      <thead><tr>{columns.map((column) => (column === '' ? <td key={column} /> : <th key={column} scope="col">{column}</th>))}</tr></thead>
      {rows.map((row) => (
        <tbody key={row.id}>
          <tr>
            <th scope="row" data-label={first}>{row.name}</th>
            {row.cells.map((cell, index) => <td key={others[index]} data-label={others[index]}>{cell}</td>)}
          </tr>
          {row.findings === null ? null : <tr className={styles['findings']}><td colSpan={columns.length}><div className={styles['list']}>{row.findings}</div></td></tr>}
        </tbody>
      ))}
    </table>
  );
}
