import type { CoverageRow } from '../proof-view';

/** Menu sections by stations, with how many items each cooks; an empty cell is quiet, a lost item is not. */
export function Coverage({ stations, rows }: { readonly stations: readonly string[]; readonly rows: readonly CoverageRow[] }) {
  return (
    <div className="relative overflow-x-auto" tabIndex={0} role="region" aria-label="What is cooked where">
      <table className="w-full text-left text-[13.5px]">
        <caption className="sr-only">Items of each menu section by station</caption>
        <thead>
          <tr className="text-[12.5px] text-soft"><th scope="col" className="px-2.5 py-1.5">Menu section</th>{stations.map((station) => <th key={station} scope="col" className="px-2.5 py-1.5">{station}</th>)}<th scope="col" className="px-2.5 py-1.5">Lost</th></tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.section} className="border-t border-line">
              <th scope="row" className="px-2.5 py-1.5 font-semibold whitespace-nowrap">{row.section} <span className="font-normal text-quiet">{row.items}</span></th>
              {row.cooked.map((count, index) => <td key={stations[index]} className={`px-2.5 py-1.5 ${count === 0 ? 'text-quiet' : 'bg-calm-tint font-semibold text-calm-text'}`}>{count === 0 ? '–' : count}</td>)}
              <td className={`px-2.5 py-1.5 ${row.lost === 0 ? 'text-quiet' : 'bg-hot-tint font-semibold text-hot-text'}`}>{row.lost === 0 ? '–' : row.lost}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
