import type { Metadata } from 'next';
import { FindingList } from '@/features/fixes/components/finding-list';
import { StationOrderLoader, StationPanelLoader } from '@/features/stations/components/panel-loader';
import { StationsPage } from '@/features/stations/components/stations-page';
import { stationsOverview } from '@/features/stations/station-rows';
import { viewStation } from '@/features/stations/station-view';
import { may } from '@/lib/domain/roles/permissions';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Stations' };

type Props = {
  readonly params: Promise<{ readonly site: string }>;
  readonly searchParams: Promise<{ readonly station?: string; readonly add?: string; readonly order?: string }>;
};

export default async function Page({ params, searchParams }: Props) {
  const { site, membership } = await openSite((await params).site, 'site.read');
  const { station: wanted, add, order } = await searchParams;
  const mayWrite = may(membership, 'station.write');
  const opened = site.stations.find((station) => station.id === wanted) ?? null;
  const panel = opened !== null || (add === 'station' && mayWrite)
    ? <StationPanelLoader key={opened?.id ?? 'new'} view={viewStation(site, opened, mayWrite)} />
    : order === 'all' && mayWrite ? <StationOrderLoader siteId={site.id} stations={site.stations} /> : null;
  return (
    <StationsPage
      siteId={site.id}
      overview={stationsOverview(site)}
      mayWrite={mayWrite}
      findings={(findings) => <FindingList siteId={site.id} membership={membership} findings={findings} />}
      panel={panel}
    />
  );
}
