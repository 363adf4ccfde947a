import type { Metadata } from 'next';
import { FindingList } from '@/features/fixes/components/finding-list';
import { PrinterPanelLoader } from '@/features/printers/components/panel-loader';
import { PrintersPage } from '@/features/printers/components/printers-page';
import { panelView } from '@/features/printers/panel-view';
import { printersOverview } from '@/features/printers/printer-rows';
import { may } from '@/lib/domain/roles/permissions';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Printers' };

type Props = {
  readonly params: Promise<{ readonly site: string }>;
  readonly searchParams: Promise<{ readonly printer?: string; readonly add?: string }>;
};

export default async function Page({ params, searchParams }: Props) {
  const { site, membership } = await openSite((await params).site, 'site.read');
  const { printer: wanted, add } = await searchParams;
  const mayWrite = may(membership, 'printer.write');
  const opened = site.printers.find((printer) => printer.id === wanted) ?? null;
  const panelOpen = opened !== null || (add === 'printer' && mayWrite);
  return (
    <PrintersPage
      site={{ id: site.id, tills: site.tills, timeZone: site.timeZone }}
      overview={printersOverview(site)}
      mayWrite={mayWrite}
      findings={(findings) => <FindingList siteId={site.id} membership={membership} findings={findings} />}
      panel={panelOpen ? <PrinterPanelLoader key={opened?.id ?? 'new'} view={panelView(site, membership, opened)} /> : null}
    />
  );
}
