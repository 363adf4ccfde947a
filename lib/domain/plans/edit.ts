import type { RuleId, SectionId, StationId } from '../site/ids';
import type { Conditions, PlanContent } from '../site/plan';
import type { CopyTarget, SendTarget, SplitTarget } from './targets';

/** One card as it hangs: its rule and station; both null while it lies in the tray of what prints nowhere. */
export type HungCard = {
  readonly target: SendTarget | CopyTarget;
  readonly rule: RuleId | null;
  readonly from: StationId | null;
};

/**
 * One change a person makes on the board, as data: it can be sent, kept while the connection is out, told in words
 * and applied again on newer content.
 */
export type PlanEdit =
  /** Where these cook under exactly these conditions; without stations left, the rule goes. */
  | {
    readonly kind: 'send';
    readonly targets: readonly SendTarget[];
    readonly conditions: Conditions;
    readonly how: 'replace' | 'add' | 'remove';
    readonly stations: readonly StationId[];
  }
  /** Cards moved to a rail, or off their rail and back to the tray (`to` null). */
  | { readonly kind: 'hang'; readonly cards: readonly HungCard[]; readonly to: StationId | null }
  /** Every send rule of these targets goes, conditional ones too. */
  | { readonly kind: 'take-off'; readonly targets: readonly SendTarget[] }
  | {
    readonly kind: 'split';
    readonly target: SplitTarget;
    readonly conditions: Conditions;
    readonly stations: readonly StationId[];
    readonly keep: boolean;
  }
  | {
    readonly kind: 'copy';
    readonly targets: readonly CopyTarget[];
    readonly conditions: Conditions;
    readonly how: 'add' | 'remove';
    readonly stations: readonly StationId[];
  }
  | {
    readonly kind: 'change-rule';
    readonly rule: RuleId;
    readonly conditions?: Conditions;
    readonly stations?: readonly StationId[];
    readonly keep?: boolean;
  }
  | { readonly kind: 'remove-rules'; readonly rules: readonly RuleId[] }
  /** Put a rule just above another one, or last (`above` null): a later rule wins a tie. */
  | { readonly kind: 'reorder'; readonly rule: RuleId; readonly above: RuleId | null }
  /** `all` are the menu's sections, so that offering the last missing one means "all" again. */
  | { readonly kind: 'offer'; readonly sections: readonly SectionId[]; readonly offered: boolean; readonly all: readonly SectionId[] }
  /** An earlier content again: undo, redo, a version of the history, another plan. */
  | { readonly kind: 'restore'; readonly content: PlanContent; readonly words: string };
