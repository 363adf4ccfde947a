import { countWords } from '@/lib/domain/plans/words';
import type { DrillLine } from '@/lib/domain/proof/summary';

/** How many of the printers that lose something are named; the rest are one press away on the proof's own page. */
const shownLines = 6;

/** What would be lost if one printer stopped; those that nothing hangs on are one line. */
export function DrillBars({ drill }: { readonly drill: readonly DrillLine[] }) {
  const losing = drill.filter((line) => line.itemsLost > 0);
  const holding = drill.length - losing.length;
  const shown = losing.slice(0, shownLines);
  // The worst one leaves room for its words.
  const full = Math.max(1, ...losing.map((line) => line.itemsLost)) * 1.25;
  return (
    <ul className="grid grid-cols-[minmax(74px,auto)_1fr_auto] items-center gap-x-2.5 gap-y-1.5 text-[12.5px]">
      {shown.map((line) => (
        <li key={line.printer} className="contents">
          <span className="font-mono font-semibold">{line.name}</span>
          <span aria-hidden className="block h-2 bg-line">
            <span className="block h-2 bg-hot" style={{ width: `${Math.round((100 * line.itemsLost) / full)}%` }} />
          </span>
          <span className="text-right font-[640] tabular-nums">{line.itemsLost}, on {countWords(line.tillsAffected, 'till')}</span>
        </li>
      ))}
      {losing.length > shown.length ? <li className="col-span-3 text-quiet">and {losing.length - shown.length} more</li> : null}
      {holding === 0 ? null : (
        <li className="contents">
          <span className="font-mono font-semibold">{losing.length === 0 ? 'any one' : 'others'}</span>
          <span aria-hidden className="block h-2 bg-line" />
          <span className="text-right font-semibold text-calm-text">0, backups hold</span>
        </li>
      )}
    </ul>
  );
}
