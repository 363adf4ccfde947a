/** One measured line of `npm run bench`. */
export type Figure = {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  /** In words: ">= 300,000", "<= 50", or "peer" for what stands beside ours for comparison. */
  readonly goal: string;
  readonly holds: boolean;
};
