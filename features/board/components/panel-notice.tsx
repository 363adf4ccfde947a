'use client';

import { redo, undo } from '../store/make-edit';
import { useBoard, useStore } from './board-context';

/** What was just done, inside the panel that covers the board: seen, read out, and taken back from here. */
export function PanelNotice() {
  const store = useStore();
  const notice = useBoard((state) => state.notice);
  return (
    <div role="status" className="flex items-center gap-4 rounded-lg bg-calm-tint px-3 py-1.5 text-[13px] empty:hidden">
      {notice === null ? null : (
        <>
          <span className="flex-1">{notice.words}.</span>
          {notice.offers === 'nothing' ? null : (
            <button
              type="button"
              className="min-h-8 font-semibold underline underline-offset-3"
              onClick={() => store.set((state) => (notice.offers === 'undo' ? undo(state, store.site) : redo(state, store.site)))}
            >
              {notice.offers === 'undo' ? 'Undo' : 'Redo'}
            </button>
          )}
        </>
      )}
    </div>
  );
}
