import type { Metadata } from 'next';
import { MenuPage } from '@/features/menu/components/menu-page';
import { viewMenu } from '@/features/menu/menu-view';
import { may } from '@/lib/domain/roles/permissions';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Menu' };

type Props = {
  readonly params: Promise<{ readonly site: string }>;
  readonly searchParams: Promise<{ readonly section?: string | string[]; readonly search?: string | string[] }>;
};

const single = (value: string | string[] | undefined): string | undefined => (typeof value === 'string' ? value : undefined);

export default async function Page({ params, searchParams }: Props) {
  const { site, membership } = await openSite((await params).site, 'site.read');
  const { section, search } = await searchParams;
  return <MenuPage view={viewMenu(site, single(section), (single(search) ?? '').trim().slice(0, 80))} mayWrite={may(membership, 'menu.write')} />;
}
