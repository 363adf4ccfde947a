import { boardOf } from '@/lib/domain/plans/board-of';
import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { BoardState } from './board-state';

export type BoardStore = {
  readonly site: BoardSite;
  readonly get: () => BoardState;
  readonly set: (change: (state: BoardState) => BoardState) => void;
  readonly subscribe: (listener: () => void) => () => void;
};

export const firstState = (site: BoardSite, content: PlanContent, version: number): BoardState => ({
  content,
  board: boardOf(site, content),
  version,
  saved: content,
  saving: 'saved',
  refusal: '',
  pending: [],
  past: [],
  future: [],
  chosen: new Set(),
  lifted: null,
  notice: null,
  conflict: null,
  focus: null,
  said: { id: 0, words: '' },
});

/** State outside React: a component draws again only when what it selects has changed. */
export const createBoardStore = (site: BoardSite, content: PlanContent, version: number): BoardStore => {
  let state = firstState(site, content, version);
  const listeners = new Set<() => void>();
  return {
    site,
    get: () => state,
    set: (change) => {
      const next = change(state);
      if (next === state) return;
      state = next;
      for (const listener of listeners) listener();
    },
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
};
