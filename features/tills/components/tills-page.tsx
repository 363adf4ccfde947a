import Link from 'next/link';
import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/button-link';
import { DeviceTable } from '@/components/device-table';
import { EmptyState } from '@/components/empty-state';
import { findingActionClass } from '@/components/finding-card';
import { PageHead } from '@/components/page-head';
import { kindWords, sourceWords } from '@/lib/domain/devices/till-words';
import type { Finding } from '@/lib/domain/findings/finding';
import type { TillRow, TillsOverview } from '../till-rows';

type TillsPageProps = {
  readonly siteId: string;
  readonly overview: TillsOverview;
  readonly hasAreas: boolean;
  readonly mayWrite: boolean;
  /** Draws findings with their fixes. */
  readonly findings: (findings: readonly Finding[]) => ReactNode;
  /** The panel that is open, if one is. */
  readonly panel: ReactNode;
};

function Where({ row }: { readonly row: TillRow }) {
  const { till, printsThrough } = row;
  if (till.kind === 'online') return <>Through the print link</>;
  if (printsThrough !== null) return <>Prints through {printsThrough}</>;
  if (till.address === '') return <>{sourceWords[till.addressSource]}</>;
  return <span className="font-mono font-semibold">{till.address}</span>;
}

const installed = ({ till, tested }: TillRow): string =>
  (till.kind === 'online' || till.queues.length === 0 ? (till.kind === 'online' ? 'The link\'s' : 'None') : `${till.queues.length}, ${tested} tested`);

/** All tills of a site, what is wrong with them first, each mend one press away. */
export function TillsPage({ siteId, overview, hasAreas, mayWrite, findings, panel }: TillsPageProps) {
  const href = (query: string): string => `/sites/${siteId}/tills?${query}`;
  const { rows } = overview;
  return (
    <>
      <PageHead title={overview.verdict} sub={overview.said}>
        {mayWrite ? <ButtonLink href={href('areas=all')} scroll={false}>Areas</ButtonLink> : null}
        {mayWrite && hasAreas ? <ButtonLink kind="primary" href={href('add=till')} scroll={false}>Add a till</ButtonLink> : null}
      </PageHead>
      <div className="grid gap-4 px-4 py-4 md:px-[22px]">
        <h2 className="sr-only">Tills</h2>
        {rows.length === 0 ? (
          <EmptyState title="No tills yet" words={hasAreas ? 'Write down each till, handheld and online channel that sends orders. What is installed on each comes next.' : 'Say first which areas the room has: the bar, the terrace. Each till stands in one.'}>
            {mayWrite ? <ButtonLink href={href(hasAreas ? 'add=till' : 'areas=all')} scroll={false}>{hasAreas ? 'Write down the first one' : 'Write down the areas'}</ButtonLink> : null}
          </EmptyState>
        ) : (
          <DeviceTable
            caption="Tills"
            columns={['Till', 'Address', 'Area', 'Kind', 'Printers', '']}
            rows={rows.map((row) => ({
              id: row.till.id,
              name: <b>{row.till.name}</b>,
              cells: [
                <Where key="where" row={row} />,
                row.area,
                kindWords[row.till.kind],
                installed(row),
                <Link key="open" className={findingActionClass} href={href(`till=${row.till.id}`)} scroll={false} aria-label={`${mayWrite ? 'Edit' : 'Open'} ${row.till.name}`}>{mayWrite ? 'Edit' : 'Open'}</Link>,
              ],
              findings: row.findings.length === 0 ? null : findings(row.findings),
            }))}
          />
        )}
      </div>
      {panel}
    </>
  );
}
