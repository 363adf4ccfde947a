import { checkSite } from '@/lib/domain/checks/check-site';
import { summarise } from '@/lib/domain/proof/summarise';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';

/** The site is sent once and kept; a plan and a state come with every question. */
export type ProofQuestion =
  | { readonly kind: 'site'; readonly site: Site }
  | { readonly kind: 'prove'; readonly number: number; readonly plan: Plan; readonly present: Present };

export type ProofAnswer = { readonly number: number; readonly summary: ProofSummary; readonly workMs: number };

let site: Site | null = null;

self.addEventListener('message', ({ data }: MessageEvent<ProofQuestion>) => {
  if (data.kind === 'site') {
    site = data.site;
    return;
  }
  if (site === null) return;
  const start = performance.now();
  const whole = { ...site, plans: site.plans.map((plan) => (plan.id === data.plan.id ? data.plan : plan)) };
  const summary = summarise(whole, data.plan, checkSite(whole, data.plan), data.present);
  self.postMessage({ number: data.number, summary, workMs: performance.now() - start } satisfies ProofAnswer);
});
