import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { FindingList } from '@/features/fixes/components/finding-list';
import { FixButtons } from '@/features/fixes/components/fix-buttons';
import { ProofPage } from '@/features/proof/components/proof-page';
import { viewProof } from '@/features/proof/proof-view';
import { mayFix } from '@/lib/domain/findings/fix-permissions';
import { openSite } from '@/lib/server/page-access';
import { readLivePlan } from '@/lib/server/read-live-plan';

export const metadata: Metadata = { title: 'Proof' };

type Props = { readonly params: Promise<{ readonly site: string }>; readonly searchParams: Promise<{ readonly plan?: string | string[] }> };

export default async function Page({ params, searchParams }: Props) {
  const { site, membership } = await openSite((await params).site, 'site.read');
  const { plan: wanted } = await searchParams;
  const plan = site.plans.find((one) => one.id === wanted) ?? site.plans.find((one) => one.id === site.live?.planId) ?? site.plans[0];
  if (plan === undefined) notFound();
  return (
    <ProofPage
      site={site} plan={plan} view={viewProof(site, plan, await readLivePlan(site))}
      findings={(findings) => <FindingList siteId={site.id} membership={membership} findings={findings} />}
      fixes={(fixes) => <FixButtons siteId={site.id} fixes={fixes.filter((fix) => mayFix(membership, fix))} />}
    />
  );
}
