import type { Metadata } from 'next';
import { InvitePanelLoader, MemberPanelLoader } from '@/features/people/components/panel-loaders';
import { PeoplePage } from '@/features/people/components/people-page';
import { listPeople } from '@/features/people/server/list-people';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'People' };

type Props = {
  readonly params: Promise<{ readonly site: string }>;
  readonly searchParams: Promise<{ readonly person?: string; readonly invite?: string }>;
};

export default async function Page({ params, searchParams }: Props) {
  const { person, membership, site } = await openSite((await params).site, 'people.write');
  const { person: wanted, invite } = await searchParams;
  const people = await listPeople({ person, membership, siteId: site.id }, new Date());
  const opened = people.members.find(({ id }) => id === wanted);
  return (
    <PeoplePage
      view={{ siteId: site.id, timeZone: site.timeZone, ...people }}
      panel={opened !== undefined ? <MemberPanelLoader key={opened.id} siteId={site.id} member={opened} /> : invite === 'new' ? <InvitePanelLoader siteId={site.id} /> : null}
    />
  );
}
