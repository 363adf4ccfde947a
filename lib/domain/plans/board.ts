import type { RuleId, SectionId, StationId } from '../site/ids';
import type { Conditions } from '../site/plan';
import type { CopyTarget, SendTarget } from './targets';

/** One paper on a rail, or in the tray. A rule with several stations hangs as one card on each of their rails. */
export type Card = {
  /** Unique on the board and the same from one edit to the next: what it is about, and where it hangs. */
  readonly id: string;
  readonly kind: 'send' | 'copy';
  readonly target: SendTarget | CopyTarget;
  readonly rule: RuleId | null;
  readonly station: StationId | null;
  readonly conditions: Conditions;
  readonly name: string;
  /** The quiet line: "18 items", "of Burgers", "copy, by seat". */
  readonly under: string;
  /** Items that cook here because of this card when nothing more is known of the order; 0 with conditions. */
  readonly items: number;
  /** What must hold for it: "Terrace", "take away". */
  readonly tags: readonly string[];
  /** What differs from the rule: "side salad splits to Larder", "Terrace prints at Bar". */
  readonly notes: readonly string[];
  /** Codes of the other stations that the same rule cooks at. */
  readonly alsoAt: readonly string[];
};

export type Rail = {
  readonly station: StationId;
  /** Items that cook here when nothing more is known of the order. */
  readonly items: number;
  /** A pass that copies everything, whatever the order. */
  readonly wholeOrder: boolean;
  readonly cards: readonly Card[];
};

export type NotOffered = { readonly section: SectionId; readonly name: string; readonly items: number };

export type Board = {
  /** In the stations' order. */
  readonly rails: readonly Rail[];
  /** Menu sections with items that no rule covers, counting those items. */
  readonly tray: readonly Card[];
  readonly notOffered: readonly NotOffered[];
  /** Rules that no card shows: they cover nothing that is offered. */
  readonly unseen: readonly RuleId[];
};
