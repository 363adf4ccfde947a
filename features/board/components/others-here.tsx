'use client';

import { listWords } from '@/lib/domain/plans/words';
import { useBoard } from './board-context';

/** Who else has this plan open. */
export function OthersHere() {
  const others = useBoard((state) => state.others);
  if (others.length === 0) return null;
  return <p className="text-[13px] text-soft"><b className="font-[640] text-ink">{listWords(others)}</b> {others.length === 1 ? 'is' : 'are'} on this board too</p>;
}
