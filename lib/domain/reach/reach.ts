import type { PrinterId, TillId } from '../site/ids';

/** Measured beats worked out, and a printed test beats an answer. */
export const reachStrengths = ['worked-out', 'answered', 'printed'] as const;
export type ReachStrength = (typeof reachStrengths)[number];

export const reachStrengthWords: Readonly<Record<ReachStrength, string>> = {
  'worked-out': 'worked out',
  answered: 'answered',
  printed: 'printed',
};

/** The direction in which packets get lost: to the printer, back to the till, or neither knows the other. */
export type BrokenDirection = 'to-printer' | 'to-till' | 'both';

/** Whether a printer can be printed to from a till, how that is known, and why. */
export type Reach = {
  readonly reaches: boolean;
  readonly strength: ReachStrength;
  /** ISO 8601 UTC of the answer or the printed test; null when worked out. */
  readonly measuredAt: string | null;
  /** One or two sentences. */
  readonly why: string;
  /** Set when an address or a mask puts one out of the other's network. */
  readonly broken: BrokenDirection | null;
  /** The till that does the printing, when it is another one. */
  readonly via: TillId | null;
  /** True when the till's own address is not known and it counts as in the site's subnet. */
  readonly assumed: boolean;
};

/** What a ping or a connection attempt from a till told. */
export type Answer = {
  readonly till: TillId;
  readonly printer: PrinterId;
  readonly answers: boolean;
  /** ISO 8601 UTC. */
  readonly at: string;
};

export type ReachOptions = {
  /** These host nothing and nothing prints through them. */
  readonly offTills?: readonly TillId[];
  readonly answers?: readonly Answer[];
};
