'use client';

import { Button } from '@/components/button';
import { sayCards } from '@/lib/domain/plans/drop';
import { cardsNamed } from '../store/lift';
import { useBoard, useStore } from './board-context';
import { useOpened } from './opened';

/** What is chosen, and where it may all go at once. */
export function ChosenBar() {
  const store = useStore();
  const { open } = useOpened();
  const chosen = useBoard((state) => state.chosen);
  if (chosen.size === 0) return null;
  const cards = cardsNamed(store.get(), [...chosen]);
  const sections = cards.every((card) => card.target.kind === 'section');
  const words = cards.length === 1 ? `${sayCards(cards)} chosen` : `${cards.length} ${sections ? 'sections' : 'cards'} chosen`;
  return (
    <div role="region" aria-label="Chosen cards" className="fixed inset-x-4 bottom-4 z-30 mx-auto flex max-w-[560px] flex-wrap items-center gap-3 rounded-xl bg-night px-4 py-3 text-white shadow-[0_14px_34px_rgba(30,25,10,.35)]">
      <span className="flex-1 font-semibold">{words}</span>
      <Button onClick={(event) => open({ kind: 'send', cards: [...chosen], beside: event.currentTarget })}>Send to</Button>
      <button type="button" className="min-h-9 px-2 font-semibold underline underline-offset-3" onClick={() => store.set((state) => ({ ...state, chosen: new Set() }))}>Choose none</button>
    </div>
  );
}
