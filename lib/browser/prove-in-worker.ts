import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { ProofAnswer, ProofQuestion } from './proof-worker';

export type Prover = {
  /** The latest question wins: answers to earlier ones are dropped. */
  readonly prove: (plan: Plan, present: Present) => void;
  readonly useSite: (site: Site) => void;
  readonly stop: () => void;
};

/**
 * Proves plans beside the page, so that typing and dragging never wait. One question is under way at a time and only
 * the newest of those that came meanwhile is asked next.
 */
export const startProver = (site: Site, onSummary: (summary: ProofSummary, plan: Plan) => void, onLost: (reason: string) => void): Prover => {
  const worker = new Worker(new URL('./proof-worker.ts', import.meta.url), { type: 'module' });
  const ask = (question: ProofQuestion): void => worker.postMessage(question);
  let number = 0;
  let underWay: Plan | null = null;
  let waiting: { readonly plan: Plan; readonly present: Present } | null = null;

  const next = (): void => {
    if (underWay !== null || waiting === null) return;
    const { plan, present } = waiting;
    waiting = null;
    underWay = plan;
    number += 1;
    ask({ kind: 'prove', number, plan, present });
  };
  worker.addEventListener('message', ({ data }: MessageEvent<ProofAnswer>) => {
    const proven = underWay;
    underWay = null;
    if (proven !== null && waiting === null && data.number === number) onSummary(data.summary, proven);
    next();
  });
  worker.addEventListener('error', () => {
    underWay = null;
    onLost('The check stopped in this browser. What you see is the last one that finished; reload the page to start it again.');
  });
  ask({ kind: 'site', site });
  return {
    prove: (plan, present) => {
      waiting = { plan, present };
      next();
    },
    useSite: (newer) => ask({ kind: 'site', site: newer }),
    stop: () => worker.terminate(),
  };
};
