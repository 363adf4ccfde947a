'use client';

import { useBoard } from './board-context';

/** The board's voice for screen readers. Two regions in turn, so that the same words twice are said twice. */
export function Said() {
  const said = useBoard((state) => state.said);
  const odd = said.id % 2 === 1;
  return (
    <div className="sr-only">
      <p id="board-keys">
        Space lifts this card, the arrow keys carry it from rail to rail, Space drops it and Escape puts it back. Enter opens it. Shift and Space choose several.
      </p>
      <div role="status" aria-live="assertive" aria-atomic="true">{odd ? said.words : ''}</div>
      <div role="status" aria-live="assertive" aria-atomic="true">{odd ? '' : said.words}</div>
    </div>
  );
}
