'use client';

import Link from 'next/link';
import { FindingCard, findingActionClass } from '@/components/finding-card';
import type { ProofFinding, WayToOrder } from '@/lib/domain/proof/summary';
import { useBoard, useSettings, useStore } from './board-context';
import { useFix } from './fixing';
import { ProofAside } from './proof-aside';
import { cardsShowing } from './show-way';

/** The order that shows a finding, ready to be tried. */
const tryHref = (siteId: string, planId: string, way: WayToOrder): string =>
  `/sites/${siteId}/try?${new URLSearchParams([
    ['plan', planId], ['till', way.till], ['type', way.orderType], ['item', way.item], ...way.options.map((option) => ['option', option]),
  ]).toString()}`;

function BoardFinding({ finding }: { readonly finding: ProofFinding }) {
  const store = useStore();
  const { siteId, planId } = useSettings();
  const fix = useFix();
  const show = (): void => store.set((state) => ({ ...state, shown: cardsShowing(state, finding, store.site) }));
  const hide = (): void => store.set((state) => ({ ...state, shown: new Set() }));
  return (
    <FindingCard severity={finding.severity} title={finding.title} message={finding.message}>
      {finding.example === null ? null : (
        <Link className={findingActionClass} href={tryHref(siteId, planId, finding.example)} onMouseEnter={show} onMouseLeave={hide} onFocus={show} onBlur={hide}>
          Show the way it goes
        </Link>
      )}
      {finding.fixes.filter(fix.canFix).map((mend) => (mend.kind === 'print-test' ? (
        <Link key={mend.label} className={findingActionClass} href={`/sites/${siteId}/printers?printer=${mend.printer}`}>{mend.label}</Link>
      ) : (
        <button key={mend.label} type="button" className={findingActionClass} onClick={() => fix.apply(mend)}>{mend.label}</button>
      )))}
    </FindingCard>
  );
}

/** The check beside the board, of what hangs on it now. */
export function BoardAside() {
  const summary = useBoard((state) => state.proof);
  const trouble = useBoard((state) => state.proofTrouble);
  const empty = useBoard((state) => state.content.rules.length === 0);
  return (
    <section id="findings" tabIndex={-1} aria-label="Check of this plan" className="grid content-start gap-3.5 border-line bg-panel px-5 py-4.5 max-[1179px]:border-t min-[1180px]:border-t min-[1180px]:border-l">
      {summary === null ? null : <ProofAside summary={summary} drawFinding={(finding) => <BoardFinding finding={finding} />} />}
      {trouble === '' ? null : <p role="status" className="text-[13px] font-semibold text-look-text">{trouble}</p>}
      {empty ? <p className="text-[13px] text-soft">Begin with the tray: send each menu section to the station that cooks it.</p> : null}
    </section>
  );
}
