import { applyEdit } from '@/lib/domain/plans/apply-edit';
import { boardOf } from '@/lib/domain/plans/board-of';
import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { PlanContent } from '@/lib/domain/site/plan';
import type { RuleId } from '@/lib/domain/site/ids';
import type { BoardState, MadeEdit } from './board-state';
import { shareStructure } from './share-structure';

/** How many steps Undo remembers. */
const stepsKept = 100;

export type Site = BoardSite;
export type NewRuleId = () => RuleId;

const tell = (state: BoardState, words: string, offers: 'undo' | 'redo' | 'nothing'): Pick<BoardState, 'notice' | 'said'> => ({
  notice: { id: (state.notice?.id ?? 0) + 1, words, offers },
  said: { id: state.said.id + 1, words },
});

/** A save that was refused is tried again with the next edit: it may be the one that mends it. */
const saveAgain = (state: BoardState): BoardState['saving'] => (state.saving === 'refused' ? 'saving' : state.saving);

/** The state with other content on the board; parts that did not change keep their identity. */
export const withContent = (state: BoardState, content: PlanContent, site: Site): BoardState => {
  const board = shareStructure(state.board, boardOf(site, content));
  const standing = new Set([...board.tray, ...board.rails.flatMap((rail) => rail.cards)].map((card) => card.id));
  const chosen = [...state.chosen].every((card) => standing.has(card)) ? state.chosen : new Set([...state.chosen].filter((card) => standing.has(card)));
  return { ...state, content, board, chosen };
};

/** Several edits made as one step, told in one sentence. Nothing happens when they change nothing. */
export const makeStep = (state: BoardState, made: readonly MadeEdit[], words: string, site: Site, newId: NewRuleId): BoardState => {
  const content = made.reduce((standing, { edit }) => applyEdit(standing, edit, newId), state.content);
  if (JSON.stringify(content) === JSON.stringify(state.content)) return state;
  const step = { content: state.content, words: made.length === 1 ? (made[0]?.words ?? words) : words };
  return {
    ...withContent(state, content, site),
    pending: [...state.pending, ...made],
    past: [...state.past, step].slice(-stepsKept),
    future: [],
    chosen: new Set(),
    saving: saveAgain(state),
    ...tell(state, words, 'undo'),
  };
};

const lowerFirst = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);

export const undo = (state: BoardState, site: Site): BoardState => {
  const step = state.past.at(-1);
  if (step === undefined) return state;
  const words = `Taken back: ${step.words}`;
  return {
    ...withContent(state, step.content, site),
    pending: [...state.pending, { edit: { kind: 'restore', content: step.content, words }, words }],
    past: state.past.slice(0, -1),
    future: [...state.future, { content: state.content, words: step.words }],
    saving: saveAgain(state),
    ...tell(state, words, 'redo'),
  };
};

export const redo = (state: BoardState, site: Site): BoardState => {
  const step = state.future.at(-1);
  if (step === undefined) return state;
  const words = `Done again: ${step.words}`;
  return {
    ...withContent(state, step.content, site),
    pending: [...state.pending, { edit: { kind: 'restore', content: step.content, words }, words }],
    past: [...state.past, { content: state.content, words: step.words }],
    future: state.future.slice(0, -1),
    saving: saveAgain(state),
    ...tell(state, words, 'undo'),
  };
};

/** One line for the history: what these edits did, the first ones named. */
export const summaryOf = (pending: readonly MadeEdit[]): string => {
  const words = pending.map((made) => made.words);
  if (words.length <= 3) return words.map((line, place) => (place === 0 ? line : lowerFirst(line))).join('; ');
  return `${words.slice(0, 2).join('; ')} and ${words.length - 2} more`;
};
