'use client';

import { createContext, useContext, useSyncExternalStore } from 'react';
import type { Fix } from '@/lib/domain/findings/finding';
import type { RuleId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import { asId } from '@/lib/domain/site/ids';
import type { PlanTab } from '../board-view';
import type { BoardState } from '../store/board-state';
import type { BoardStore } from '../store/create-board-store';
import type { RailStation } from './rail-station';

/** What holds for the whole board and does not change with an edit. */
export type BoardSettings = {
  readonly siteId: string;
  readonly planId: string;
  readonly planName: string;
  readonly stations: readonly RailStation[];
  /** What is live of this plan; null while another plan is live. */
  readonly liveContent: PlanContent | null;
  readonly plans: readonly PlanTab[];
  readonly mayWrite: boolean;
  readonly mayFix: readonly Fix['kind'][];
};

export const StoreContext = createContext<BoardStore | null>(null);
export const SettingsContext = createContext<BoardSettings | null>(null);

export const useStore = (): BoardStore => {
  const store = useContext(StoreContext);
  if (store === null) throw new Error('A part of the board was drawn outside it.');
  return store;
};

export const useSettings = (): BoardSettings => {
  const settings = useContext(SettingsContext);
  if (settings === null) throw new Error('A part of the board was drawn outside it.');
  return settings;
};

/** Draws again only when what is selected is another value; select parts of the state, or plain values. */
export const useBoard = <Selected>(select: (state: BoardState) => Selected): Selected => {
  const store = useStore();
  const snapshot = (): Selected => select(store.get());
  return useSyncExternalStore(store.subscribe, snapshot, snapshot);
};

/** randomUUID is missing on plain http away from this machine; getRandomValues is always there. */
export const newRuleId = (): RuleId =>
  asId<RuleId>([...crypto.getRandomValues(new Uint8Array(8))].map((byte) => byte.toString(16).padStart(2, '0')).join(''));
