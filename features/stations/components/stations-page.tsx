import Link from 'next/link';
import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/button-link';
import { DeviceTable } from '@/components/device-table';
import { EmptyState } from '@/components/empty-state';
import { findingActionClass } from '@/components/finding-card';
import { PageHead } from '@/components/page-head';
import { Stamp } from '@/components/stamp';
import { Tag } from '@/components/tag';
import type { Finding } from '@/lib/domain/findings/finding';
import { kindWords, ticketWords } from '@/lib/domain/stations/station-words';
import type { StationRow, StationsOverview } from '../station-rows';

type StationsPageProps = {
  readonly siteId: string;
  readonly overview: StationsOverview;
  readonly mayWrite: boolean;
  /** Draws findings with their fixes. */
  readonly findings: (findings: readonly Finding[]) => ReactNode;
  /** The panel that is open, if one is. */
  readonly panel: ReactNode;
};

/** In a line of the table the words stand on one height with the stamp; in a card on a phone they need none of that. */
function Cell({ children }: { readonly children: ReactNode }) {
  return <span className="min-[721px]:inline-block min-[721px]:max-w-[36ch] min-[721px]:py-1.5 min-[721px]:leading-5">{children}</span>;
}

function Name({ row: { station } }: { readonly row: StationRow }) {
  return (
    <span className="flex items-center gap-2.5">
      <Stamp code={station.code} mesh={station.mesh} colour={station.colour} size="small" />
      <span className="leading-tight"><b>{station.name}</b><span className="sr-only">, code {station.code}</span>{station.kind === 'pass' ? <span className="block text-[12px] text-quiet">{kindWords.pass}</span> : null}</span>
    </span>
  );
}

function Printers({ row }: { readonly row: StationRow }) {
  if (row.printers.length === 0) return <Tag tone="hot">No printer</Tag>;
  return row.printers.map((name, index) => <span key={name}>{index === 0 ? '' : ', then '}<span className="font-mono font-semibold">{name}</span></span>);
}

/** All stations of a site in their order. A line reads as a sentence: Grill, cooks these, prints there. */
export function StationsPage({ siteId, overview, mayWrite, findings, panel }: StationsPageProps) {
  const href = (query: string): string => `/sites/${siteId}/stations?${query}`;
  const { rows } = overview;
  return (
    <>
      <PageHead title={overview.verdict} sub={overview.said === '' ? undefined : overview.said}>
        {mayWrite && rows.length > 1 ? <ButtonLink href={href('order=all')} scroll={false}>Put in order</ButtonLink> : null}
        {mayWrite ? <ButtonLink kind="primary" href={href('add=station')} scroll={false}>Add a station</ButtonLink> : null}
      </PageHead>
      <div className="grid gap-4 px-4 py-4 md:px-[22px]">
        <h2 className="sr-only">Stations</h2>
        {rows.length === 0 ? (
          <EmptyState title="No stations yet" words="A station is where work is done: a grill, a larder, a bar, and the pass where orders are checked. Write them down, then hang menu sections on them.">
            {mayWrite ? <ButtonLink href={href('add=station')} scroll={false}>Write down the first one</ButtonLink> : null}
          </EmptyState>
        ) : (
          <DeviceTable
            caption="Stations"
            columns={['Station', 'Cooks', 'Prints on', 'Stand-in', 'Ticket', 'Pace', 'Now', '']}
            rows={rows.map((row) => ({
              id: row.station.id,
              name: <Name row={row} />,
              cells: [
                <Cell key="cooks">{row.cooks === '' ? <span className="text-quiet">Nothing hangs there</span> : row.cooks}</Cell>,
                <Cell key="printers"><Printers row={row} /></Cell>,
                <Cell key="stand-in">{row.standIn === '' ? <span className="text-quiet">None</span> : row.standIn}</Cell>,
                <Cell key="ticket">{ticketWords(row.station.layout, row.station.ticketsPerSending)}</Cell>,
                <Cell key="pace">{row.station.pace === null ? <span className="text-quiet">Not said</span> : `${row.station.pace} in 15 min`}</Cell>,
                <Cell key="now">{row.station.open ? <Tag tone="calm">Open</Tag> : <Tag tone="look">Closed</Tag>}</Cell>,
                <Link key="open" className={`${findingActionClass} min-[721px]:min-h-8`} href={href(`station=${encodeURIComponent(row.station.id)}`)} scroll={false} aria-label={`${mayWrite ? 'Edit' : 'Open'} ${row.station.name}`}>{mayWrite ? 'Edit' : 'Open'}</Link>,
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
