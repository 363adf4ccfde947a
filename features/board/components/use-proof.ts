'use client';

import { useEffect } from 'react';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import { asId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import { fetchSite } from '../api/fetch-site';
import type { LiveProof } from '../store/start-live-proof';
import { startLiveProof } from '../store/start-live-proof';
import { useSettings, useStore } from './board-context';

/**
 * Keeps the proof that of what hangs on the board. The first comes with the page, each later one from a worker that
 * is loaded after the first paint.
 *
 * @param fromPage the proof of `proven`, the content that the page was made with
 */
export const useProof = (fromPage: ProofSummary, proven: PlanContent): void => {
  const store = useStore();
  const { siteId, planId, mayWrite } = useSettings();

  // Starts again with each newer page: a printer renamed there makes the worker's reading of the site old.
  useEffect(() => {
    store.set((state) => ({ ...state, proof: fromPage, proofTrouble: '' }));
    let asked = proven;
    const load = async () => {
      const [site, { startProver }] = await Promise.all([fetchSite(siteId, planId), import('@/lib/browser/prove-in-worker')]);
      return { site, startProver };
    };
    const live: LiveProof = startLiveProof(asId(planId), load, (outcome) =>
      store.set((state) => (outcome.kind === 'proven'
        ? { ...state, proof: outcome.summary, proofTrouble: '' }
        : { ...state, proofTrouble: outcome.words })));
    const warming = setTimeout(() => mayWrite && live.warm(), 1_500);
    const look = (): void => {
      const { content } = store.get();
      if (content === asked) return;
      const same = JSON.stringify(content) === JSON.stringify(asked);
      asked = content;
      if (same) return;
      live.prove(content);
    };
    look();
    const unsubscribe = store.subscribe(look);
    return () => {
      clearTimeout(warming);
      unsubscribe();
      live.stop();
    };
  }, [store, fromPage, proven, siteId, planId, mayWrite]);
};
