import type { Metadata } from 'next';
import { FindingList } from '@/features/fixes/components/finding-list';
import { SettingsPanelLoader } from '@/features/site-settings/components/panel-loader';
import { SettingsPage } from '@/features/site-settings/components/settings-page';
import { isPart, partOrder, partPermissions } from '@/features/site-settings/parts';
import { partView } from '@/features/site-settings/view';
import { networkFindings } from '@/lib/domain/addresses/network-findings';
import { bySeverity } from '@/lib/domain/findings/finding';
import { may } from '@/lib/domain/roles/permissions';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Site' };

type Props = {
  readonly params: Promise<{ readonly site: string }>;
  readonly searchParams: Promise<{ readonly edit?: string }>;
};

export default async function Page({ params, searchParams }: Props) {
  const { site, membership } = await openSite((await params).site, 'network.write');
  const { edit } = await searchParams;
  const writable = new Set(partOrder.filter((part) => may(membership, partPermissions[part])));
  const findings = bySeverity(networkFindings(site));
  return (
    <SettingsPage
      site={site}
      writable={writable}
      findings={findings.length === 0 ? null : <FindingList siteId={site.id} membership={membership} findings={findings} />}
      panel={isPart(edit) && writable.has(edit) ? <SettingsPanelLoader key={edit} view={partView(edit, site)} /> : null}
    />
  );
}
