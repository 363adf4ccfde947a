import type { Metadata } from 'next';
import { TryOrderPage } from '@/features/try-order/components/try-order-page';
import { readLivePlan } from '@/lib/server/read-live-plan';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Try an order' };

export default async function Page({ params }: { readonly params: Promise<{ readonly site: string }> }) {
  const { site } = await openSite((await params).site, 'order.try');
  return <TryOrderPage site={site} livePlan={await readLivePlan(site)} />;
}
