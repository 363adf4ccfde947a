import type { KeyboardEvent } from 'react';
import { cancelLift, choose, drop, lift, moveBy } from '../store/lift';
import { newRuleId } from './board-context';
import type { BoardStore } from '../store/create-board-store';

const steps: Readonly<Record<string, number>> = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 };

/**
 * Space lifts and drops, arrows carry between the rails, Enter drops, Escape puts back; Shift and Space choose. True when the key was the board's.
 */
const handle = (event: KeyboardEvent<HTMLElement>, card: string, store: BoardStore): boolean => {
  const { lifted } = store.get();
  const { key } = event;
  if (lifted === null) {
    if (key !== ' ') return false;
    store.set((state) => (event.shiftKey ? choose(state, card) : lift(state, card, 'keyboard', store.site)));
    return true;
  }
  const step = steps[key];
  if (step !== undefined) store.set((state) => moveBy(state, step, store.site));
  else if (key === ' ' || key === 'Enter') drop(store, newRuleId);
  else if (key === 'Escape') store.set(cancelLift);
  else return key !== 'Tab';
  return true;
};

export const onCardKey = (event: KeyboardEvent<HTMLElement>, card: string, store: BoardStore): void => {
  if (event.ctrlKey || event.metaKey || event.altKey) return;
  if (handle(event, card, store)) event.preventDefault();
};

/** A button would press itself when Space comes up again; lifting has used that Space already. */
export const swallowSpace = (event: KeyboardEvent<HTMLElement>): void => {
  if (event.key === ' ') event.preventDefault();
};
