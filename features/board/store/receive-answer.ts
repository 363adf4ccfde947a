import { differences } from '@/lib/domain/plans/differences';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { BoardState } from './board-state';
import type { Site } from './make-edit';
import { withContent } from './make-edit';
import type { SaveAnswer, SaveRequest } from './save-answer';

/**
 * Newer content from somebody else takes the place of what is on the board. Undo ends here: it would take their change
 * back too. An undo that was not saved is not offered again either, for the same reason.
 */
export const takeTheirs = (state: BoardState, theirs: { version: number; content: PlanContent; by: string }, site: Site): BoardState => {
  const changes = differences(state.saved, theirs.content, site).map((difference) => difference.words);
  const mine = state.pending.filter((made) => made.edit.kind !== 'restore');
  const next: BoardState = {
    ...withContent(state, theirs.content, site),
    version: theirs.version, saved: theirs.content, pending: [], past: [], future: [], lifted: null, saving: 'saved', refusal: '',
  };
  const words = `${theirs.by} changed this plan: ${changes.length === 0 ? 'nothing that prints' : changes.slice(0, 3).join('; ')}`;
  const said = { id: state.said.id + 1, words };
  if (state.pending.length === 0) {
    return { ...next, said, notice: { id: (state.notice?.id ?? 0) + 1, words, offers: 'nothing' } };
  }
  return { ...next, said, notice: null, conflict: { by: theirs.by, changes, mine } };
};

/** What a save's answer does to the board; `sent` is how many pending edits the request carried. */
export const receiveAnswer = (state: BoardState, answer: SaveAnswer, request: SaveRequest, sent: number, site: Site): BoardState => {
  switch (answer.kind) {
    case 'saved': {
      const pending = state.pending.slice(sent);
      return { ...state, version: answer.version, saved: request.content, pending, saving: pending.length === 0 ? 'saved' : 'saving', refusal: '' };
    }
    case 'stale': return takeTheirs(state, answer, site);
    case 'refused': return { ...state, saving: 'refused', refusal: answer.words };
    case 'unreachable': return { ...state, saving: 'offline' };
  }
};

/** The page was read again: newer content takes over unless this person's own edits are still on their way. */
export const receiveReading = (state: BoardState, reading: { version: number; content: PlanContent }, site: Site): BoardState =>
  (reading.version <= state.version || state.pending.length > 0
    ? state
    : { ...withContent(state, reading.content, site), version: reading.version, saved: reading.content, past: [], future: [] });
