import Link from 'next/link';
import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/button-link';
import { Tag } from '@/components/tag';
import type { Finding, Fix } from '@/lib/domain/findings/finding';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import type { DrillRow, ProofColumn, ProofView } from '../proof-view';
import { Coverage } from './coverage';
import { DrillTable } from './drill-table';

export type ProofPageProps = {
  readonly site: Pick<Site, 'id' | 'plans' | 'live'>;
  readonly plan: Plan;
  readonly view: ProofView;
  readonly findings: (findings: readonly Finding[]) => ReactNode;
  readonly fixes: (fixes: readonly Fix[]) => ReactNode;
};

function Panel({ title, sub, children }: { readonly title: string; readonly sub?: ReactNode; readonly children: ReactNode }) {
  return (
    <section className="grid content-start gap-3 rounded-[9px] border border-line bg-raised p-4 md:p-5">
      <header className="grid gap-1"><h2 className="text-[17px]">{title}</h2>{sub === undefined ? null : <p className="max-w-[80ch] text-[13px] text-soft">{sub}</p>}</header>
      {children}
    </section>
  );
}

const counts = (column: ProofColumn): string => {
  const of = (severity: string): number => column.findings.filter((finding) => finding.severity === severity).length;
  return `${of('stop')} to fix, ${of('check')} to look at, ${of('note')} to know`;
};

function Column({ title, column, children }: { readonly title: string; readonly column: ProofColumn; readonly children?: ReactNode }) {
  return (
    <section className="grid content-start gap-2.5">
      <h2 className="border-b border-line pb-1.5 text-[13.5px] font-[640] text-soft">{title}</h2>
      <p className={`text-[23px] leading-tight font-[680] font-stretch-[104%] text-balance ${column.lost + column.partLost > 0 ? 'text-hot-text' : ''}`}>{column.verdict}</p>
      <p className="text-[13px] text-soft">{counts(column)}</p>
      {children}
    </section>
  );
}

const drilled = (rows: readonly DrillRow[], harmless: number): string =>
  rows.length === 0 ? `${harmless} single faults were tried, and none loses an order.` : `${rows.length} of ${rows.length + harmless} single faults lose orders. What hurts most comes first.`;

/** The whole check of a plan: as it was made, and as the kitchen is now; what breaks it, and what it covers. */
export function ProofPage({ site, plan, view, findings, fixes }: ProofPageProps) {
  return (
    <>
      <header className="flex flex-wrap items-center gap-3.5 px-4 pt-3.5 md:px-[22px]">
        <h1>Proof</h1>
        <nav aria-label="Plans" className="flex max-w-full overflow-x-auto rounded-[7px] border border-line-strong bg-raised">
          {site.plans.map((one) => (
            <Link key={one.id} href={`/sites/${site.id}/proof?plan=${encodeURIComponent(one.id)}`} aria-current={one.id === plan.id ? 'page' : undefined} className="border-r border-line px-3.5 py-[9px] text-[13.5px] leading-tight font-medium whitespace-nowrap text-soft last:border-r-0 aria-[current=page]:bg-ink aria-[current=page]:font-semibold aria-[current=page]:text-on-ink">{one.name}</Link>
          ))}
        </nav>
        <div className="flex-1" />
        <ButtonLink href={`/sites/${site.id}/board?plan=${encodeURIComponent(plan.id)}`}>To the board</ButtonLink>
      </header>
      <div className="grid gap-4 px-4 py-4 md:px-[22px]">
        <p className="text-[13.5px] text-soft">{view.tried}</p>
        <div className="grid gap-6 rounded-[9px] border border-line bg-panel p-4 md:grid-cols-2 md:p-5">
          <Column title={`${plan.name}, with everything well`} column={view.plan} />
          <Column title={`${plan.name}, in the kitchen as it is now`} column={view.now}>
            {view.unusual.length === 0 ? <p><Tag tone="calm">Every station is open and every printer is up</Tag></p> : <ul className="grid gap-1 text-[13.5px] font-semibold text-look-text">{view.unusual.map((words) => <li key={words}>{words}</li>)}</ul>}
          </Column>
        </div>
        <section aria-label="Findings" className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,340px),1fr))] items-start gap-2.5">{findings(view.plan.findings)}</section>
        {view.changes === null ? null : (
          <Panel title="What differs from what is live" sub={view.changes.length === 0 ? 'Every way to order prints the same as now.' : 'Each sentence stands for every way to order that it covers.'}>
            <ul className="grid gap-1.5 text-[13.5px]">
              {view.changes.map((change) => (
                <li key={`${change.kind} ${change.words}`} className="flex flex-wrap items-baseline gap-2">
                  <Tag tone={change.kind === 'newly-lost' ? 'hot' : change.kind === 'newly-printing' ? 'calm' : 'plain'}>{change.kind === 'newly-lost' ? 'Newly lost' : change.kind === 'newly-printing' ? 'Newly printing' : 'Moved'}</Tag>
                  <span>{change.words.charAt(0).toUpperCase() + change.words.slice(1)}</span><span className="text-quiet">{change.ways} ways</span>
                </li>
              ))}
            </ul>
          </Panel>
        )}
        <Panel title="Fault drill" sub={drilled(view.single, view.harmless)}><DrillTable rows={view.single} caption="Single points of failure" fixes={fixes} /></Panel>
        {view.pairs.length === 0 ? null : <Panel title="Two printers at once" sub="Pairs that lose what neither loses alone."><DrillTable rows={view.pairs} caption="Pairs of printers" fixes={fixes} /></Panel>}
        <Panel title="What is cooked where" sub="Items of each menu section by the station that cooks them, as the proof found it."><Coverage stations={view.stations} rows={view.coverage} /></Panel>
      </div>
    </>
  );
}
