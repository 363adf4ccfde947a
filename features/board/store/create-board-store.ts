import { boardOf } from '@/lib/domain/plans/board-of';
import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { BoardState } from './board-state';
import { withContent } from './make-edit';
import { shareStructure } from './share-structure';

export type BoardStore = {
  /** Names and who belongs where, as last read from the server. */
  readonly site: BoardSite;
  /** Takes over a newer reading: a section renamed, a station added. */
  readonly readSite: (site: BoardSite) => void;
  readonly get: () => BoardState;
  readonly set: (change: (state: BoardState) => BoardState) => void;
  readonly subscribe: (listener: () => void) => () => void;
};

export const firstState = (site: BoardSite, content: PlanContent, version: number, proof: ProofSummary | null): BoardState => ({
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
  proof,
  proofTrouble: '',
  others: [],
  shown: new Set(),
  settled: null,
  focus: null,
  said: { id: 0, words: '' },
});

/** State outside React: a component draws again only when what it selects has changed. */
export const createBoardStore = (firstSite: BoardSite, content: PlanContent, version: number, proof: ProofSummary | null = null): BoardStore => {
  let site = firstSite;
  let state = firstState(site, content, version, proof);
  const listeners = new Set<() => void>();
  const set: BoardStore['set'] = (change) => {
    const next = change(state);
    if (next === state) return;
    state = next;
    for (const listener of listeners) listener();
  };
  return {
    get site() {
      return site;
    },
    readSite: (newer) => {
      site = shareStructure(site, newer);
      set((standing) => withContent(standing, standing.content, site));
    },
    get: () => state,
    set,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
};
