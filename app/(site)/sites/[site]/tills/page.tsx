import type { Metadata } from 'next';
import { FindingList } from '@/features/fixes/components/finding-list';
import { AreasPanelLoader, TillPanelLoader } from '@/features/tills/components/panel-loaders';
import { TillsPage } from '@/features/tills/components/tills-page';
import { areasView, panelView } from '@/features/tills/panel-view';
import { tillsOverview } from '@/features/tills/till-rows';
import { may } from '@/lib/domain/roles/permissions';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Tills' };

type Props = {
  readonly params: Promise<{ readonly site: string }>;
  readonly searchParams: Promise<{ readonly till?: string; readonly add?: string; readonly areas?: string }>;
};

export default async function Page({ params, searchParams }: Props) {
  const { site, membership } = await openSite((await params).site, 'site.read');
  const { till: wanted, add, areas } = await searchParams;
  const mayWrite = may(membership, 'till.write');
  const opened = site.tills.find((till) => till.id === wanted) ?? null;
  const tillOpen = opened !== null || (add === 'till' && mayWrite && site.areas.length > 0);
  return (
    <TillsPage
      siteId={site.id}
      overview={tillsOverview(site)}
      hasAreas={site.areas.length > 0}
      mayWrite={mayWrite}
      findings={(findings) => <FindingList siteId={site.id} membership={membership} findings={findings} />}
      panel={tillOpen ? <TillPanelLoader key={opened?.id ?? 'new'} view={panelView(site, membership, opened)} />
        : areas === 'all' && mayWrite ? <AreasPanelLoader view={areasView(site, membership)} /> : null}
    />
  );
}
