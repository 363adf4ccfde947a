'use client';

import { describeEdit } from '@/lib/domain/plans/describe-edit';
import type { PlanEdit } from '@/lib/domain/plans/edit';
import { makeStep } from '../store/make-edit';
import { newRuleId, useStore } from './board-context';

/** Makes an edit as one step of Undo. `words` is what the notice says; without it, the edit's own line. */
export const useMakeEdit = (): ((edit: PlanEdit, words?: string) => void) => {
  const store = useStore();
  return (edit, words) => store.set((state) => {
    const line = describeEdit(edit, store.site, state.content);
    return makeStep(state, [{ edit, words: line }], words ?? line, store.site, newRuleId);
  });
};
