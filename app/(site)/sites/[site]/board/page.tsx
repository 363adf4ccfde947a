import type { Metadata } from 'next';
import { BoardScreen } from '@/features/board/components/board-screen';
import { NoPlan } from '@/features/board/components/no-plan';
import { planToShow, viewBoard } from '@/features/board/server/view-board';
import { may } from '@/lib/domain/roles/permissions';
import { openSite } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Board' };

type BoardPageProps = {
  readonly params: Promise<{ site: string }>;
  readonly searchParams: Promise<{ plan?: string | string[] }>;
};

export default async function BoardPage({ params, searchParams }: BoardPageProps) {
  const { site: siteId } = await params;
  const { plan: asked } = await searchParams;
  const opened = await openSite(siteId, 'site.read');
  const plan = planToShow(opened.site, typeof asked === 'string' ? asked : undefined);
  if (plan === null) return <NoPlan siteId={siteId} mayWrite={may(opened.membership, 'plan.write')} />;
  return <BoardScreen view={await viewBoard(opened, plan)} />;
}
