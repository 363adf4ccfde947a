import type { ReactNode } from 'react';
import Link from 'next/link';
import { ButtonLink } from '@/components/button-link';
import { DeviceTable } from '@/components/device-table';
import { EmptyState } from '@/components/empty-state';
import { findingActionClass } from '@/components/finding-card';
import { PageHead } from '@/components/page-head';
import { Stamp } from '@/components/stamp';
import { Tag } from '@/components/tag';
import type { Site } from '@/lib/domain/site/site';
import { kindWords, layoutWords } from '../station-view';

type StationsPageProps = { readonly site: Site; readonly mayWrite: boolean; readonly panel: ReactNode };

/** All stations of a site in their order: what each is, where it prints, and who stands in. */
export function StationsPage({ site, mayWrite, panel }: StationsPageProps) {
  const href = (query: string): string => `/sites/${site.id}/stations?${query}`;
  const printerNames = new Map(site.printers.map((printer) => [printer.id, printer.name]));
  const names = new Map(site.stations.map((station) => [station.id, station.name]));
  const closed = site.stations.filter((station) => !station.open).length;
  const silent = site.stations.filter((station) => station.printers.length === 0).length;
  const said = [closed === 0 ? 'All are open.' : `${closed} closed.`, silent === 0 ? '' : `${silent} without a printer.`].filter((words) => words !== '').join(' ');
  return (
    <>
      <PageHead title={`${site.stations.length} stations`} sub={site.stations.length === 0 ? undefined : said}>
        {mayWrite && site.stations.length > 1 ? <ButtonLink href={href('order=yes')} scroll={false}>Put in order</ButtonLink> : null}
        {mayWrite ? <ButtonLink kind="primary" href={href('add=station')} scroll={false}>Add a station</ButtonLink> : null}
      </PageHead>
      <div className="grid gap-4 px-4 py-4 md:px-[22px]">
        {site.stations.length === 0 ? (
          <EmptyState title="No stations yet" words="A station is where work is done: a grill, a larder, a bar, and the pass where orders are checked. Write them down, then hang menu sections on them.">
            {mayWrite ? <ButtonLink href={href('add=station')} scroll={false}>Write down the first one</ButtonLink> : null}
          </EmptyState>
        ) : (
          <DeviceTable
            caption="Stations"
            columns={['Station', 'What it does', 'Printers', 'Stand-in', 'Ticket', 'Pace', 'Now', '']}
            rows={site.stations.map((station) => ({
              id: station.id,
              name: <span className="flex items-center gap-2.5"><Stamp code={station.code} mesh={station.mesh} colour={station.colour} size="small" /><b>{station.name}</b></span>,
              cells: [
                kindWords[station.kind],
                station.printers.length === 0 ? <Tag key="none" tone="hot">Prints nowhere</Tag> : <span key="printers" className="font-mono">{station.printers.map((printer) => printerNames.get(printer)).join(', then ')}</span>,
                station.standIn === null ? 'None' : names.get(station.standIn) ?? '',
                `${layoutWords[station.layout]}${station.ticketsPerSending === 1 ? '' : `, ${station.ticketsPerSending} times`}`,
                station.pace === null ? '' : `${station.pace} in 15 minutes`,
                station.open ? <Tag key="open" tone="calm">Open</Tag> : <Tag key="open" tone="look">Closed</Tag>,
                <Link key="edit" href={href(`station=${encodeURIComponent(station.id)}`)} scroll={false} className={findingActionClass}>{mayWrite ? 'Edit' : 'Look'}<span className="sr-only"> {station.name}</span></Link>,
              ],
              findings: null,
            }))}
          />
        )}
      </div>
      {panel}
    </>
  );
}
