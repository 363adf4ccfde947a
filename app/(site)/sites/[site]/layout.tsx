import type { ReactNode } from 'react';
import { LiveLine } from '@/components/live-line';
import { PersonMenu } from '@/components/person-menu';
import { RailNav } from '@/components/rail-nav';
import { TopBar } from '@/components/top-bar';
import { liveWords } from '@/lib/domain/plans/live-words';
import { homePath, navigationFor } from '@/lib/navigation';
import { chosenLight } from '@/lib/server/chosen-light';
import { mySites, openSite } from '@/lib/server/page-access';

type SiteLayoutProps = { readonly params: Promise<{ readonly site: string }>; readonly children: ReactNode };

export default async function SiteLayout({ params, children }: SiteLayoutProps) {
  const { person, membership, site } = await openSite((await params).site, 'site.read');
  const [{ sites }, light] = await Promise.all([mySites(), chosenLight()]);
  const manySites = sites.length > 1;
  return (
    <div className="flex min-h-dvh flex-col">
      <a href="#content" className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:m-2 focus:rounded focus:bg-raised focus:px-3 focus:py-2">Skip to the page</a>
      <header>
        <TopBar home={manySites ? '/sites' : homePath(site.id, membership.role)} site={site}>
          <LiveLine live={liveWords(site)} />
          <PersonMenu person={{ name: person.name, title: membership.title }} light={light} manySites={manySites} />
        </TopBar>
        <RailNav siteId={site.id} links={navigationFor(membership.role)} />
      </header>
      <main id="content" tabIndex={-1} className="flex flex-1 flex-col outline-none">{children}</main>
    </div>
  );
}
