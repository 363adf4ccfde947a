import type { Metadata } from 'next';
import Link from 'next/link';
import { EmptyState } from '@/components/empty-state';
import { TopBar } from '@/components/top-bar';
import { homePath } from '@/lib/navigation';
import { mySites } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'My sites' };

export default async function SitesPage() {
  const { person, sites } = await mySites();
  return (
    <>
      <header><TopBar person={{ name: person.name, title: '' }} back="/sites" manySites={false} /></header>
      <main className="relative">
        <div aria-hidden className="h-[11px] shadow-[0_1px_2px_rgb(0_0_0/0.2)]" style={{ background: 'var(--rail)' }} />
        <div className="grid gap-5 px-4 py-5 md:px-[22px]">
          <h1>My sites</h1>
          {sites.length === 0 ? (
            <EmptyState title="No site yet" words="You belong to no site at the moment. An owner can invite you to theirs; the invitation comes by e-mail." />
          ) : (
            <ul className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3 xl:grid-cols-4">
              {sites.map(({ id, name, place, membership }) => (
                <li key={id}>
                  <Link href={homePath(id, membership.role)} className="block rounded-b-[3px] border border-paper-edge bg-paper px-4 pt-5 pb-4 text-paper-ink shadow-[0_1px_2px_rgb(40_35_20/0.14)] hover:shadow-[0_4px_12px_rgb(40_35_20/0.18)]">
                    <b className="block text-[17px] leading-tight">{name}</b>
                    <span className="block text-[13px] text-paper-quiet">{place}</span>
                    <span className="mt-2 block text-[12.5px] text-paper-quiet">You are {membership.title === '' ? membership.role : membership.title} here</span>
                  </Link>
                </li>
              ))}
            </ul>
          )}
        </div>
      </main>
    </>
  );
}
