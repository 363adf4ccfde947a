import { PageHead } from '@/components/page-head';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { TryOrderLoader } from './try-order-loader';

/** Where an order is written and its paper is seen, without a thing reaching the kitchen. */
export function TryOrderPage({ site, livePlan }: { readonly site: Site; readonly livePlan: Plan | null }) {
  return (
    <>
      <PageHead title="Try an order" sub="Nothing here reaches the kitchen." />
      <TryOrderLoader site={{ ...site, contacts: [] }} livePlan={livePlan} />
    </>
  );
}
