import type { Prover, startProver } from '@/lib/browser/prove-in-worker';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { PlanId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import { allWell } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';

export type ProofOutcome =
  | { readonly kind: 'proven'; readonly summary: ProofSummary }
  /** Why what is shown is older than the board. */
  | { readonly kind: 'trouble'; readonly words: string };

export type LiveProof = {
  /** Loads what a proof needs before the first edit asks for it, so that it also works once the network has gone. */
  readonly warm: () => void;
  readonly prove: (content: PlanContent) => void;
  readonly stop: () => void;
};

type Load = () => Promise<{ readonly site: Site; readonly startProver: typeof startProver }>;

/** Milliseconds until what could not be loaded is tried again. */
const again = 3_000;

const outOfReach = 'The check of your last change waits for the connection. What you see is the one before it.';

/** Proves a plan's content after each edit. What it needs, the worker and the whole site, is loaded with the first. */
export const startLiveProof = (planId: PlanId, load: Load, tell: (outcome: ProofOutcome) => void): LiveProof => {
  let stopped = false;
  let prover: Promise<Prover> | null = null;
  let retry: ReturnType<typeof setTimeout> | undefined;

  const begin = async (): Promise<Prover> => {
    const loaded = await load();
    return loaded.startProver(
      loaded.site,
      (summary) => tell({ kind: 'proven', summary }),
      (words) => tell({ kind: 'trouble', words }),
    );
  };

  const prove = async (content: PlanContent): Promise<void> => {
    clearTimeout(retry);
    try {
      prover ??= begin();
      const running = await prover;
      if (!stopped) running.prove({ ...content, id: planId, name: '', position: 0, version: 0, weeklyTimes: [] }, allWell);
    } catch {
      prover = null;
      if (stopped) return;
      tell({ kind: 'trouble', words: outOfReach });
      retry = setTimeout(() => void prove(content), again);
    }
  };

  return {
    warm: () => {
      prover ??= begin();
      prover.catch(() => {
        prover = null;
      });
    },
    prove: (content) => void prove(content),
    stop: () => {
      stopped = true;
      clearTimeout(retry);
      void prover?.then((running) => running.stop(), () => undefined);
    },
  };
};
