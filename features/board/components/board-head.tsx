'use client';

import { Button, buttonClass } from '@/components/button';
import { countWords } from '@/lib/domain/plans/words';
import { redo, undo } from '../store/make-edit';
import { useBoard, useSettings, useStore } from './board-context';
import { useOpened } from './opened';
import { useNotLive } from './use-not-live';

/** What of this plan is not live yet; a press lists it. */
export function NotLive({ livePlanName }: { readonly livePlanName: string | null }) {
  const changes = useNotLive();
  const { liveContent } = useSettings();
  const { open } = useOpened();
  if (liveContent === null) {
    return <p className="text-[13px] text-soft">{livePlanName === null ? 'No plan is live yet' : `Not live: ${livePlanName} is`}</p>;
  }
  if (changes.length === 0) return <p className="text-[13px] text-soft">Live as it stands here</p>;
  return (
    <button type="button" className="min-h-6 text-[13px] text-soft underline decoration-line-strong underline-offset-4 hover:decoration-current" onClick={() => open({ kind: 'changes' })}>
      {countWords(changes.length, 'change')} that {changes.length === 1 ? 'is' : 'are'} not live yet
    </button>
  );
}

/** Undo and Redo, each saying what it would take back or do again. */
export function UndoButtons() {
  const store = useStore();
  const { mayWrite } = useSettings();
  const last = useBoard((state) => state.past.at(-1)?.words ?? null);
  const next = useBoard((state) => state.future.at(-1)?.words ?? null);
  if (!mayWrite) return null;
  return (
    <>
      <Button disabled={last === null} title={last === null ? undefined : `Take back: ${last} (Ctrl+Z)`} onClick={() => store.set((state) => undo(state, store.site))}>Undo</Button>
      {next === null ? null : <Button title={`Do again: ${next} (Ctrl+Shift+Z)`} onClick={() => store.set((state) => redo(state, store.site))}>Redo</Button>}
    </>
  );
}

/** How many findings stand between this plan and going live; a press goes to them. */
export function ToFixLink() {
  const toFix = useBoard((state) => state.proof?.findings.filter((finding) => finding.severity === 'stop').length ?? 0);
  if (toFix === 0) return null;
  return (
    <a href="#findings" className={buttonClass('wait')}>{toFix} to fix before it can go live</a>
  );
}
