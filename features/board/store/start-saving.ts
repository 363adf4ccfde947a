import type { BoardStore } from './create-board-store';
import { summaryOf } from './make-edit';
import { receiveAnswer } from './receive-answer';
import type { SaveAnswer, SaveRequest } from './save-answer';

/** Milliseconds before the next try while the connection is out; the last one repeats. */
const retryAfterMs = [1_000, 2_000, 5_000, 10_000];

export type Saver = {
  /** Tries at once: the connection may be back, or a refused save may be tried again. */
  readonly retry: () => void;
  readonly stop: () => void;
};

/**
 * Sends what is pending, one request at a time: whatever is edited meanwhile goes with the next. Nothing leaves the
 * queue before the server has confirmed it.
 */
export const startSaving = (store: BoardStore, save: (request: SaveRequest) => Promise<SaveAnswer>): Saver => {
  let sending = false;
  let stopped = false;
  let failures = 0;
  let timer: ReturnType<typeof setTimeout> | null = null;

  const send = async (): Promise<void> => {
    const { pending, content, version } = store.get();
    if (stopped || sending || pending.length === 0) return;
    sending = true;
    const request = { version, content, summary: summaryOf(pending) };
    const answer = await save(request);
    sending = false;
    failures = answer.kind === 'unreachable' ? failures + 1 : 0;
    store.set((state) => receiveAnswer(state, answer, request, pending.length, store.site));
  };

  const next = (): void => {
    const { pending, saving } = store.get();
    if (stopped || sending || pending.length === 0 || timer !== null || saving === 'refused') return;
    if (saving !== 'offline') {
      void send();
      return;
    }
    timer = setTimeout(() => {
      timer = null;
      void send();
    }, retryAfterMs[Math.min(failures - 1, retryAfterMs.length - 1)]);
  };

  const unsubscribe = store.subscribe(next);
  next();
  return {
    retry: () => {
      if (timer !== null) clearTimeout(timer);
      timer = null;
      void send();
    },
    stop: () => {
      stopped = true;
      if (timer !== null) clearTimeout(timer);
      unsubscribe();
    },
  };
};
