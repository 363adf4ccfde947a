import type { ReactNode } from 'react';
import { DeviceTable } from '@/components/device-table';
import type { Fix } from '@/lib/domain/findings/finding';
import type { DrillRow } from '../proof-view';

type DrillTableProps = { readonly rows: readonly DrillRow[]; readonly caption: string; readonly fixes: (fixes: readonly Fix[]) => ReactNode };

const losses = (row: DrillRow): string =>
  [row.lost === 0 ? '' : `${row.lost} lost`, row.partLost === 0 ? '' : `${row.partLost} in part`].filter((words) => words !== '').join(', ');

const proposed = (row: DrillRow): string =>
  row.proposal === null ? '' : row.proposal.leavesLost === 0 ? 'Then nothing is lost.' : `Then ${row.proposal.leavesLost} ways to order would still be lost.`;

/** What each fault takes with it, and the one press that would close the gap. */
export function DrillTable({ rows, caption, fixes }: DrillTableProps) {
  if (rows.length === 0) return <p className="text-[13.5px] text-calm-text">Nothing is lost.</p>;
  return (
    <DeviceTable
      caption={caption}
      columns={['What breaks', 'Items', 'For example', 'Tills', 'What would help']}
      rows={rows.map((row) => ({
        id: row.key,
        name: <><b>{row.name}</b> <span className="text-quiet">{row.kind}</span></>,
        cells: [
          <b key="lost" className="text-hot-text">{losses(row)}</b>,
          row.examples.join(', '),
          row.tills.join(', '),
          row.proposal === null ? <span key="none" className="text-quiet">Nothing on this site would close it</span>
            : <div key="help" className="grid gap-0.5">{fixes([row.proposal.fix])}<span className="text-[12.5px] text-soft">{proposed(row)} {row.proposal.warning}</span></div>,
        ],
        findings: null,
      }))}
    />
  );
}
