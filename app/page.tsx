import { redirect } from 'next/navigation';
import { homePath } from '@/lib/navigation';
import { mySites } from '@/lib/server/page-access';

/** With one site, straight to it; with more, choose. */
export default async function Home() {
  const { sites } = await mySites();
  const [only] = sites;
  redirect(sites.length === 1 && only !== undefined ? homePath(only.id, only.membership.role) : '/sites');
}
