import type { Board } from '@/lib/domain/plans/board';
import type { DropPlace } from '@/lib/domain/plans/drop';
import type { PlanEdit } from '@/lib/domain/plans/edit';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { PlanContent } from '@/lib/domain/site/plan';

/** A step that can be taken back: what stood before it, and what it did in words. */
export type Step = { readonly content: PlanContent; readonly words: string };

export type MadeEdit = { readonly edit: PlanEdit; readonly words: string };

export type Lifted = {
  readonly cards: readonly string[];
  readonly over: DropPlace | null;
  readonly by: 'pointer' | 'keyboard';
};

/** `id` rises, so that the same words twice are two notices. */
export type BoardNotice = { readonly id: number; readonly words: string; readonly offers: 'undo' | 'redo' | 'nothing' };

/** Somebody else's newer version, and what of this person's own was therefore not saved. */
export type Conflict = { readonly by: string; readonly changes: readonly string[]; readonly mine: readonly MadeEdit[] };

export type Saving = 'saved' | 'saving' | 'offline' | 'refused';

export type BoardState = {
  readonly content: PlanContent;
  readonly board: Board;
  /** The version that the server is known to hold, and what it says. */
  readonly version: number;
  readonly saved: PlanContent;
  readonly saving: Saving;
  /** Why the last save was refused, in the server's words. */
  readonly refusal: string;
  /** Edits that the server has not confirmed, oldest first. */
  readonly pending: readonly MadeEdit[];
  readonly past: readonly Step[];
  readonly future: readonly Step[];
  /** Ids of the cards chosen for moving together. */
  readonly chosen: ReadonlySet<string>;
  readonly lifted: Lifted | null;
  readonly notice: BoardNotice | null;
  readonly conflict: Conflict | null;
  /** The latest proof; null where nobody has made one. */
  readonly proof: ProofSummary | null;
  /** Why the proof is older than the board; empty while it is not. */
  readonly proofTrouble: string;
  /** Names of the others who have this plan open. */
  readonly others: readonly string[];
  /** Cards that a finding points out. */
  readonly shown: ReadonlySet<string>;
  /** The card that was hung last. */
  readonly settled: string | null;
  /** Card to put the focus on once it hangs. */
  readonly focus: string | null;
  /** What a screen reader is told next. */
  readonly said: { readonly id: number; readonly words: string };
};
