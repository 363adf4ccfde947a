import Link from 'next/link';
import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/button-link';
import { DeviceTable } from '@/components/device-table';
import { EmptyState } from '@/components/empty-state';
import { findingActionClass } from '@/components/finding-card';
import { PageHead } from '@/components/page-head';
import { Tag } from '@/components/tag';
import { sayInstant } from '@/lib/domain/devices/say-instant';
import { stageWords } from '@/lib/domain/devices/printer-words';
import type { Finding } from '@/lib/domain/findings/finding';
import type { Site } from '@/lib/domain/site/site';
import { whereIs } from '../where-is';
import type { PrinterRow, PrintersOverview } from '../printer-rows';

type PrintersPageProps = {
  readonly site: Pick<Site, 'id' | 'tills' | 'timeZone'>;
  readonly overview: PrintersOverview;
  readonly mayWrite: boolean;
  /** Draws findings with their fixes. */
  readonly findings: (findings: readonly Finding[]) => ReactNode;
  /** The panel that is open, if one is. */
  readonly panel: ReactNode;
};

function Stage({ row, timeZone }: { readonly row: PrinterRow; readonly timeZone: string }) {
  const { printer } = row;
  if (printer.downSince !== null) return <Tag tone="hot">{`Down since ${sayInstant(printer.downSince, timeZone)}`}</Tag>;
  if (printer.stage === 'signed-off') return <Tag tone="calm">{stageWords[printer.stage]}</Tag>;
  return <>{stageWords[printer.stage]}{row.installed === 0 ? '' : `, ${row.tested} of ${row.installed} tills tested`}</>;
}

/** All printers of a site, what is wrong with them first, each mend one press away. */
export function PrintersPage({ site, overview, mayWrite, findings, panel }: PrintersPageProps) {
  const href = (query: string): string => `/sites/${site.id}/printers?${query}`;
  const { rows } = overview;
  return (
    <>
      <PageHead title={overview.verdict} sub={overview.said}>
        {mayWrite ? <ButtonLink kind="primary" href={href('add=printer')} scroll={false}>Add a printer</ButtonLink> : null}
      </PageHead>
      <div className="grid gap-4 px-4 py-4 md:px-[22px]">
      <h2 className="sr-only">Printers</h2>
      {overview.siteFindings.length === 0 ? null : <section aria-label="About the network" className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,330px),1fr))] gap-2">{findings(overview.siteFindings)}</section>}
      {rows.length === 0 ? (
        <EmptyState title="No printers yet" words="Write down each ticket printer of the kitchen and the bar, with the name the tills know it by. Then stations can print on them.">
          {mayWrite ? <ButtonLink href={href('add=printer')} scroll={false}>Write down the first one</ButtonLink> : null}
        </EmptyState>
      ) : (
        <DeviceTable
          caption="Printers"
          columns={['Printer', 'Address', 'Prints for', 'Roll', 'Backup', 'Stage', '']}
          rows={rows.map((row) => ({
            id: row.printer.id,
            name: <span className="font-mono text-[13.5px] font-semibold">{row.printer.name}</span>,
            cells: [
              <span key="where" className={row.printer.connection === 'network' ? 'font-mono font-semibold' : ''}>{whereIs(row.printer, site.tills)}</span>,
              row.stations.join(', ') || 'No station yet',
              `${row.printer.rollWidthMm} mm`,
              row.backup === null ? 'None' : <span key="backup" className="font-mono">{row.backup}</span>,
              <Stage key="stage" row={row} timeZone={site.timeZone} />,
              <Link key="open" className={findingActionClass} href={href(`printer=${row.printer.id}`)} scroll={false} aria-label={`${mayWrite ? 'Edit' : 'Open'} ${row.printer.name}`}>{mayWrite ? 'Edit' : 'Open'}</Link>,
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
