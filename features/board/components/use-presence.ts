'use client';

import { useEffect } from 'react';
import { fetchPlan } from '../api/fetch-plan';
import { pingPresence } from '../api/ping-presence';
import { receiveReading, takeTheirs } from '../store/receive-answer';
import { useSettings, useStore } from './board-context';

const pingEveryMs = 20_000;

/**
 * Says every 20 seconds that this person is on the board, hears who else is, and takes over what they changed. While
 * own edits wait to be saved their answer will tell; a board that nobody looks at does not ask.
 */
export const usePresence = (): void => {
  const store = useStore();
  const { siteId, planId } = useSettings();
  useEffect(() => {
    let gone = false;
    const ping = async (): Promise<void> => {
      if (document.visibilityState === 'hidden') return;
      const heard = await pingPresence(siteId, planId);
      if (gone || heard === null) return;
      store.set((state) => (JSON.stringify(state.others) === JSON.stringify(heard.others) ? state : { ...state, others: heard.others }));
      const idle = (): boolean => store.get().pending.length === 0 && store.get().lifted === null && heard.newest > store.get().version;
      if (!idle()) return;
      const theirs = await fetchPlan(siteId, planId);
      if (gone || theirs === null || !idle()) return;
      store.set((state) => (theirs.byYou ? receiveReading(state, theirs, store.site) : takeTheirs(state, { ...theirs, by: theirs.changedBy }, store.site)));
    };
    void ping();
    const timer = setInterval(() => void ping(), pingEveryMs);
    const onVisible = (): void => void ping();
    document.addEventListener('visibilitychange', onVisible);
    return () => {
      gone = true;
      clearInterval(timer);
      document.removeEventListener('visibilitychange', onVisible);
    };
  }, [store, siteId, planId]);
};
