import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import { RailNav } from '@/components/rail-nav';
import { TopBar } from '@/components/top-bar';
import { liveWords } from '@/lib/domain/plans/live-words';
import { navigationFor } from '@/lib/navigation';
import { mySites, openSite } from '@/lib/server/page-access';

type SiteLayoutProps = { readonly params: Promise<{ readonly site: string }>; readonly children: ReactNode };

export default async function SiteLayout({ params, children }: SiteLayoutProps) {
  const { person, membership, site } = await openSite((await params).site, 'site.read');
  const { sites } = await mySites();
  const back = (await headers()).get('x-tamis-path') ?? '/';
  return (
    <div className="flex min-h-dvh flex-col">
      <a href="#content" className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:m-2 focus:rounded focus:bg-raised focus:px-3 focus:py-2">Skip to the page</a>
      <header>
        <TopBar site={site} live={liveWords(site)} person={{ name: person.name, title: membership.title }} back={back} manySites={sites.length > 1} />
        <RailNav siteId={site.id} links={navigationFor(membership.role)} />
      </header>
      <main id="content" tabIndex={-1} className="flex flex-1 flex-col outline-none">{children}</main>
    </div>
  );
}
