'use client';

import { useBoard } from './board-context';
import { cardsNamed } from '../store/lift';

/** The paper in the hand: raised, straight, with how many hang behind it. */
export function LiftedPaper({ cards }: { readonly cards: readonly string[] }) {
  const first = useBoard((state) => cardsNamed(state, cards.slice(0, 1))[0] ?? null);
  if (first === null) return null;
  return (
    <div className="w-[138px] cursor-grabbing rounded-[3px] border-[1.5px] border-ink bg-paper px-3 pt-[11px] pb-[9px] text-ink shadow-[0_16px_30px_rgba(30,25,10,.3)]">
      <b className="block text-[14px] leading-[1.15] font-semibold">{first.name}</b>
      <small className="mt-px block text-[12px] text-steel-500">
        {cards.length === 1 ? first.under : `and ${cards.length - 1} more`}
      </small>
    </div>
  );
}
