import type { ReactNode } from 'react';
import type { ProofFinding, ProofSummary } from '@/lib/domain/proof/summary';
import { countWords } from '@/lib/domain/plans/words';
import { DrillBars } from './drill-bars';
import { ProofMeshPicture } from './proof-mesh-picture';
import { VerdictWords } from './verdict-words';

type ProofAsideProps = {
  readonly summary: ProofSummary;
  /** Draws one finding with its fixes. */
  readonly drawFinding: (finding: ProofFinding) => ReactNode;
};

const headings = { stop: 'To fix before it can go live', check: 'To look at', note: 'To know' } as const;

const tried = (summary: ProofSummary): string =>
  `Tried ${summary.ways.toLocaleString('en')} ways to order: ${countWords(summary.items, 'item')} and ${countWords(summary.options, 'option')}, from ${
    countWords(summary.tills, 'till')}, in ${countWords(summary.orderTypes, 'order type')}.`;

function Group({ title, count, children }: { readonly title: string; readonly count: ReactNode; readonly children: ReactNode }) {
  return (
    <section className="grid gap-3">
      <h3 className="flex justify-between border-b border-line pb-1.5 text-[13.5px] font-[640] font-stretch-[106%]">
        {title} <span className="font-medium text-quiet">{count}</span>
      </h3>
      {children}
    </section>
  );
}

/** The verdict first, then how much was tried, then what to fix, each with its fix one press away. */
export function ProofAside({ summary, drawFinding }: ProofAsideProps) {
  const groups = (['stop', 'check', 'note'] as const)
    .map((severity) => ({ severity, findings: summary.findings.filter((finding) => finding.severity === severity) }))
    .filter((group) => group.findings.length > 0);
  return (
    <>
      <VerdictWords summary={summary} />
      <p className="text-[13px] text-soft">{tried(summary)}</p>
      <ProofMeshPicture mesh={summary.mesh} />
      {groups.map(({ severity, findings }) => (
        <Group key={severity} title={headings[severity]} count={findings.length}>
          <ul className="grid gap-3">
            {findings.map((finding) => (
              <li key={`${finding.code}/${finding.subject.kind}/${finding.subject.id}/${finding.subject.till ?? ''}/${finding.title}`}>{drawFinding(finding)}</li>
            ))}
          </ul>
        </Group>
      ))}
      {summary.drill.length === 0 ? null : (
        <Group title="If one printer stops" count="items lost"><DrillBars drill={summary.drill} /></Group>
      )}
    </>
  );
}
