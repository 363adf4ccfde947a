import type { Metadata } from 'next';
import Link from 'next/link';
import { EmptyState } from '@/components/empty-state';
import { HangingList } from '@/components/hanging-paper';
import { PageHead } from '@/components/page-head';
import { PersonMenu } from '@/components/person-menu';
import { Rail } from '@/components/rail';
import { TopBar } from '@/components/top-bar';
import { homePath } from '@/lib/navigation';
import { chosenLight } from '@/lib/server/chosen-light';
import type { MySite } from '@/lib/server/current-person';
import { mySites } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'My sites' };

function SiteCard({ id, name, place, membership }: MySite) {
  return (
    <Link href={homePath(id, membership.role)} className="block rounded-b px-4 pt-7 pb-4 hover:[&_b]:underline">
      <b className="block text-[18px] leading-tight font-[660] underline-offset-4 font-stretch-[106%]">{name}</b>
      <span className="mt-0.5 block text-[13.5px] text-soft">{place === '' ? 'No place given yet' : place}</span>
      <span className="mt-3 block text-[12.5px] text-quiet">You are here as {membership.title === '' ? membership.role : membership.title}.</span>
    </Link>
  );
}

export default async function SitesPage() {
  const [{ person, sites }, light] = await Promise.all([mySites(), chosenLight()]);
  return (
    <>
      <header>
        <TopBar home={null}><PersonMenu person={{ name: person.name, title: '' }} light={light} manySites={false} /></TopBar>
        <Rail />
      </header>
      <main className="pt-3">
        <PageHead title="My sites" sub={sites.length > 1 ? `${sites.length} restaurants, each with plans, printers and people of its own.` : undefined} />
        <div className="px-4 py-3.5 md:px-[22px]">
          {sites.length === 0 ? (
            <EmptyState title="No site yet" words="You belong to no site at the moment. An owner can invite you to theirs; the invitation comes by e-mail." />
          ) : (
            <HangingList hung={sites.map((site) => ({ id: site.id, paper: <SiteCard {...site} /> }))} />
          )}
        </div>
      </main>
    </>
  );
}
