'use client';

import type { RefObject } from 'react';
import { useEffect } from 'react';
import { savePlan } from '../api/save-plan';
import { keep, readKept } from '../store/kept-edits';
import { makeStep } from '../store/make-edit';
import { startSaving } from '../store/start-saving';
import type { BoardStore } from '../store/create-board-store';
import { newRuleId, useSettings, useStore } from './board-context';

/** Edits that an earlier visit could not save: done now when nothing has moved since, else offered. */
const takeUpKept = (store: BoardStore, siteId: string, planId: string): void => {
  const kept = readKept(localStorage, siteId, planId);
  if (kept === null) return;
  store.set((state) => {
    if (kept.version === state.version) return makeStep(state, kept.edits, 'Changes from your last visit are back on the board', store.site, newRuleId);
    const mine = kept.edits.filter((made) => made.edit.kind !== 'restore');
    // An edit whose answer never came back may have been saved all the same: then there is nothing to offer.
    const changes = makeStep(state, mine, '', store.site, newRuleId) !== state;
    return changes ? { ...state, conflict: { by: 'Somebody', changes: [], mine } } : state;
  });
};

/**
 * Saves what is edited, keeps in the browser what could not be saved, and tries again once the connection is back.
 * `retryRef` is given the way to try at once.
 */
export const useKeptEdits = (retryRef: RefObject<() => void>): void => {
  const store = useStore();
  const { siteId, planId, mayWrite } = useSettings();
  useEffect(() => {
    if (!mayWrite) return undefined;
    takeUpKept(store, siteId, planId);
    const saver = startSaving(store, (request) => savePlan(siteId, planId, request));
    let written = store.get().pending;
    // Not ended with the page: the answer to a last save may come after it, and clears what is kept.
    store.subscribe(() => {
      const { pending, version, conflict } = store.get();
      if (pending === written || conflict !== null) return;
      written = pending;
      keep(localStorage, siteId, planId, { version, edits: pending });
    });
    retryRef.current = saver.retry;
    window.addEventListener('online', saver.retry);
    return () => {
      window.removeEventListener('online', saver.retry);
      saver.stop();
    };
  }, [store, siteId, planId, mayWrite, retryRef]);
};
