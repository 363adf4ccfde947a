'use client';

import { useEffect } from 'react';
import { Button } from '@/components/button';
import { makeStep, redo, undo } from '../store/make-edit';
import { listWords } from '@/lib/domain/plans/words';
import { newRuleId, useBoard, useStore } from './board-context';
import { useSaver } from './saver-context';

const shownForMs = 8_000;
const quietButton = 'min-h-8 px-1 font-semibold underline underline-offset-3';

/** What was just done, with the way back. It is read out where it was made, so it is silent here. */
function DoneNotice() {
  const store = useStore();
  const notice = useBoard((state) => state.notice);
  useEffect(() => {
    if (notice === null) return undefined;
    const timer = setTimeout(() => store.set((state) => (state.notice === notice ? { ...state, notice: null } : state)), shownForMs);
    return () => clearTimeout(timer);
  }, [notice, store]);
  if (notice === null) return null;
  return (
    <div className="flex items-center gap-4 rounded-xl bg-night px-4 py-2 text-white shadow-[0_14px_34px_rgba(30,25,10,.35)]">
      <span>{notice.words}.</span>
      {notice.offers === 'nothing' ? null : (
        <button type="button" className={quietButton} onClick={() => store.set((state) => (notice.offers === 'undo' ? undo(state, store.site) : redo(state, store.site)))}>
          {notice.offers === 'undo' ? 'Undo' : 'Redo'}
        </button>
      )}
    </div>
  );
}

/** A connection that is out, or a save that the server refused: in words, and nothing is lost. */
function SavingNotice() {
  const saving = useBoard((state) => state.saving);
  const refusal = useBoard((state) => state.refusal);
  const waiting = useBoard((state) => state.pending.length);
  const saver = useSaver();
  if (saving !== 'offline' && saving !== 'refused') return null;
  const waits = waiting === 1 ? 'Your last change is' : `Your last ${waiting} changes are`;
  const words = saving === 'offline'
    ? `No connection. ${waits} kept in this browser and saved as soon as it is back.`
    : `${refusal} ${waits} on this screen only.`;
  return (
    <div role="alert" className="flex flex-wrap items-center gap-4 rounded-xl border border-line-strong bg-look-tint px-4 py-2 text-ink shadow-[0_14px_34px_rgba(30,25,10,.2)]">
      <span className="flex-1">{words}</span>
      <button type="button" className={quietButton} onClick={() => saver.retry()}>Try again now</button>
    </div>
  );
}

/** Somebody else was first: what they changed, and one's own changes to be done again on top. */
function ConflictNotice() {
  const store = useStore();
  const conflict = useBoard((state) => state.conflict);
  if (conflict === null) return null;
  const { by, changes, mine } = conflict;
  const again = (): void => store.set((state) =>
    makeStep({ ...state, conflict: null }, mine, `Done again on the newest: ${listWords(mine.map((made) => made.words))}`, store.site, newRuleId));
  return (
    <div role="alertdialog" aria-label="Changed by somebody else" className="grid gap-2 rounded-xl border-[1.5px] border-hot bg-raised px-4 py-3 text-ink shadow-[0_14px_34px_rgba(30,25,10,.3)]">
      <b className="text-[15px] font-[660]">{by} changed this plan while you did</b>
      {changes.length === 0 ? null : <p>{by}: {changes.slice(0, 5).join('; ')}{changes.length > 5 ? ` and ${changes.length - 5} more` : ''}.</p>}
      {mine.length === 0
        ? <p>What you took back was not saved, so that their change stays. The board shows the newest.</p>
        : <p>Not saved: {mine.map((made) => made.words).join('; ')}. The board shows the newest.</p>}
      <div className="flex flex-wrap gap-2">
        {mine.length === 0 ? null : <Button kind="primary" onClick={again}>Do mine again on the newest</Button>}
        <Button onClick={() => store.set((state) => ({ ...state, conflict: null }))}>{mine.length === 0 ? 'Go on' : 'Leave it as it is'}</Button>
      </div>
    </div>
  );
}

export function BoardNotices() {
  const raised = useBoard((state) => state.chosen.size > 0);
  return (
    <div className={`pointer-events-none fixed inset-x-4 z-30 mx-auto grid max-w-[560px] gap-2 text-[14px] *:pointer-events-auto ${raised ? 'bottom-24' : 'bottom-4'}`}>
      <ConflictNotice />
      <SavingNotice />
      <DoneNotice />
    </div>
  );
}
