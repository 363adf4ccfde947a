import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { PlanEdit } from '@/lib/domain/plans/edit';
import { describeEdit } from '@/lib/domain/plans/describe-edit';
import { asId } from '@/lib/domain/site/ids';
import { anyCondition } from '@/lib/domain/site/plan';
import { burgers, contentOf, counting, oysters, rule, smallSite } from '@/tests/fixtures/small-plan-site';
import type { BoardStore } from './create-board-store';
import { createBoardStore } from './create-board-store';
import { keep, readKept } from './kept-edits';
import { cancelLift, choose, drop, lift, moveBy } from './lift';
import { makeStep, redo, undo } from './make-edit';
import type { SaveAnswer, SaveRequest } from './save-answer';
import { startSaving } from './start-saving';

const start = contentOf(rule('r1', 'send', burgers, ['grill']));
const oystersTo = (...stations: readonly string[]): PlanEdit =>
  ({ kind: 'send', targets: [oysters], conditions: anyCondition, how: 'replace', stations: stations.map((station) => asId(station)) });

const newStore = (): BoardStore => createBoardStore(smallSite, start, 7);
const make = (store: BoardStore, edit: PlanEdit): void => {
  store.set((state) => makeStep(state, [{ edit, words: describeEdit(edit, smallSite, state.content) }], 'Done', smallSite, counting()));
};

/** A server that answers what it is told to, in turn, and remembers what it was asked. */
const answering = (...answers: readonly SaveAnswer[]) => {
  const asked: SaveRequest[] = [];
  const save = async (request: SaveRequest): Promise<SaveAnswer> => {
    const answer = answers[asked.length] ?? { kind: 'saved', version: request.version + 1 };
    asked.push(request);
    return answer;
  };
  return { asked, save };
};

describe('undo and redo', () => {
  it('walk back and forth through the same contents, each a new version to save', () => {
    const store = newStore();
    make(store, oystersTo('larder'));
    const after = store.get().content;
    store.set((state) => undo(state, smallSite));
    expect(store.get().content).toBe(start);
    store.set((state) => redo(state, smallSite));
    expect(store.get().content).toBe(after);
    expect(store.get().pending.map((made) => made.words)).toEqual(['Oysters to Larder', 'Taken back: Oysters to Larder', 'Done again: Oysters to Larder']);
  });

  it('an edit that changes nothing leaves no step', () => {
    const store = newStore();
    make(store, { kind: 'send', targets: [burgers], conditions: anyCondition, how: 'replace', stations: [asId('grill')] });
    expect(store.get().past).toEqual([]);
  });
});

describe('drawing only what changed', () => {
  it('keeps the identity of each rail that an edit does not touch', () => {
    const store = newStore();
    const before = store.get().board.rails;
    make(store, oystersTo('larder'));
    const after = store.get().board.rails;
    expect(after.map((rail, place) => rail === before[place])).toEqual([true, false, true, true]);
  });

  it('keeps the identity of every rail while a card is carried over them', () => {
    const store = newStore();
    const { board } = store.get();
    store.set((state) => lift(state, 'tray/oysters', 'keyboard', smallSite));
    store.set((state) => moveBy(state, 2, smallSite));
    expect(store.get().board).toBe(board);
  });
});

describe('lifting by keys', () => {
  it('moves a card from rail to rail and says each step', () => {
    const store = newStore();
    const said: string[] = [];
    store.subscribe(() => said.push(store.get().said.words));
    store.set((state) => lift(state, 'tray/oysters', 'keyboard', smallSite));
    store.set((state) => moveBy(state, 1, smallSite));
    store.set((state) => moveBy(state, 1, smallSite));
    drop(store, counting());
    expect(said).toEqual([
      'Oysters lifted from Prints nowhere yet. Arrow keys choose a rail, Space drops, Escape cancels.',
      'Over Grill', 'Over Larder', 'Oysters now print at Larder',
    ]);
    expect(store.get().focus).toBe('send/section:oysters/||/larder');
  });

  it('cancels without a change', () => {
    const store = newStore();
    store.set((state) => lift(state, 'tray/oysters', 'keyboard', smallSite));
    store.set((state) => moveBy(state, 1, smallSite));
    store.set(cancelLift);
    expect(store.get()).toMatchObject({ content: start, lifted: null, focus: 'tray/oysters', said: { words: 'Oysters put back' } });
  });

  it('carries all chosen cards when one of them is lifted', () => {
    const store = newStore();
    const grillCard = store.get().board.rails[0]?.cards[0]?.id ?? '';
    store.set((state) => choose(choose(state, 'tray/oysters'), grillCard));
    store.set((state) => lift(state, 'tray/oysters', 'keyboard', smallSite));
    store.set((state) => moveBy(state, 3, smallSite));
    drop(store, counting());
    expect(store.get().board.rails[2]?.cards.map((card) => card.name)).toEqual(['Burgers', 'Oysters']);
  });

  it('copies to a pass instead of moving there: nothing is cooked at a pass', () => {
    const store = newStore();
    const grillCard = store.get().board.rails[0]?.cards[0]?.id ?? '';
    store.set((state) => lift(state, grillCard, 'keyboard', smallSite));
    store.set((state) => moveBy(state, 3, smallSite));
    drop(store, counting());
    expect(store.get().content.rules.map((each) => `${each.kind} ${each.stations.join()}`)).toEqual(['send grill', 'copy pass']);
  });
});

describe('saving', () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  it('sends each edit on top of the version before it', async () => {
    const store = newStore();
    const { asked, save } = answering();
    startSaving(store, save);
    make(store, oystersTo('larder'));
    await vi.runAllTimersAsync();
    make(store, oystersTo('bar'));
    await vi.runAllTimersAsync();
    expect(asked.map(({ version, summary }) => [version, summary])).toEqual([[7, 'Oysters to Larder'], [8, 'Oysters to Bar']]);
    expect(store.get()).toMatchObject({ version: 9, saving: 'saved', pending: [] });
  });

  it('sends in one request what was edited while another was on its way', async () => {
    const store = newStore();
    const { asked, save } = answering();
    startSaving(store, save);
    make(store, oystersTo('larder'));
    make(store, oystersTo('bar'));
    make(store, oystersTo('grill'));
    await vi.runAllTimersAsync();
    expect(asked.map(({ summary }) => summary)).toEqual(['Oysters to Larder', 'Oysters to Bar; oysters to Grill']);
  });

  it('loses nothing while the connection is out, and sends it all once it is back', async () => {
    const store = newStore();
    const { asked, save } = answering({ kind: 'unreachable' }, { kind: 'unreachable' });
    startSaving(store, save);
    make(store, oystersTo('larder'));
    await vi.advanceTimersByTimeAsync(0);
    expect(store.get().saving).toBe('offline');
    make(store, oystersTo('bar'));
    await vi.runAllTimersAsync();
    expect(asked.at(-1)?.content.rules.at(-1)?.stations).toEqual(['bar']);
    expect(store.get()).toMatchObject({ saving: 'saved', pending: [] });
  });

  it('shows what somebody else changed and offers to do one\'s own again on the newest', async () => {
    const store = newStore();
    const theirs = contentOf(rule('r1', 'send', burgers, ['bar']));
    const { save } = answering({ kind: 'stale', version: 9, content: theirs, by: 'Ines Okafor' });
    startSaving(store, save);
    make(store, oystersTo('larder'));
    await vi.runAllTimersAsync();
    const { conflict, content, version } = store.get();
    expect(conflict).toMatchObject({ by: 'Ines Okafor', changes: ['Burgers from Grill to Bar'], mine: [{ words: 'Oysters to Larder' }] });
    expect([content, version]).toEqual([theirs, 9]);
    store.set((state) => makeStep({ ...state, conflict: null }, conflict?.mine ?? [], 'Done again', smallSite, counting()));
    expect(store.get().content.rules.map((each) => each.stations)).toEqual([['bar'], ['larder']]);
  });

  it('stops at a refusal and keeps the edit until a person tries again', async () => {
    const store = newStore();
    const { asked, save } = answering({ kind: 'refused', words: 'You may look, not change.' });
    const saver = startSaving(store, save);
    make(store, oystersTo('larder'));
    await vi.runAllTimersAsync();
    expect([asked.length, store.get().saving, store.get().pending.length]).toEqual([1, 'refused', 1]);
    saver.retry();
    await vi.runAllTimersAsync();
    expect(store.get().saving).toBe('saved');
  });
});

describe('after a refusal', () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  it('the next edit is sent with the refused one: it may be what mends it', async () => {
    const store = newStore();
    const { asked, save } = answering({ kind: 'refused', words: 'The station has gone.' });
    startSaving(store, save);
    make(store, oystersTo('larder'));
    await vi.runAllTimersAsync();
    store.set((state) => undo(state, smallSite));
    await vi.runAllTimersAsync();
    expect(asked.at(-1)?.content).toEqual(start);
    expect(store.get()).toMatchObject({ saving: 'saved', pending: [] });
  });
});

describe('edits kept in the browser', () => {
  const storage = (): Storage => {
    const values = new Map<string, string>();
    return {
      getItem: (key) => values.get(key) ?? null, setItem: (key, value) => void values.set(key, value), removeItem: (key) => void values.delete(key),
      clear: () => values.clear(), key: () => null, length: 0,
    };
  };

  it('come back as they were, and are gone once saved', () => {
    const kept = storage();
    const edits = [{ edit: oystersTo('larder'), words: 'Oysters to Larder' }];
    keep(kept, 'lantern-yard', 'dinner', { version: 7, edits });
    expect(readKept(kept, 'lantern-yard', 'dinner')).toEqual({ version: 7, edits });
    expect(readKept(kept, 'lantern-yard', 'lunch')).toBeNull();
    keep(kept, 'lantern-yard', 'dinner', { version: 8, edits: [] });
    expect(readKept(kept, 'lantern-yard', 'dinner')).toBeNull();
  });

  it('are left alone when they cannot be read', () => {
    const kept = storage();
    kept.setItem('tamis.board.lantern-yard.dinner', '{"version":');
    expect(readKept(kept, 'lantern-yard', 'dinner')).toBeNull();
  });
});
