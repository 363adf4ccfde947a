import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { Fix } from '@/lib/domain/findings/finding';
import type { PlanContent, WeeklyTime } from '@/lib/domain/site/plan';
import type { RailStation } from './components/rail-station';

export type PlanTab = {
  readonly id: string;
  readonly name: string;
  readonly version: number;
  readonly live: boolean;
  readonly weeklyTimes: readonly WeeklyTime[];
};

/** All that the board's page is drawn from; plain data, ready to be sent to a browser. */
export type BoardView = {
  readonly siteId: string;
  readonly mayWrite: boolean;
  /** Kinds of fixes that this person's role may press. */
  readonly mayFix: readonly Fix['kind'][];
  readonly plan: PlanTab;
  readonly plans: readonly PlanTab[];
  readonly site: BoardSite;
  readonly stations: readonly RailStation[];
  readonly content: PlanContent;
  /** What is live of this plan; null while another plan is live. */
  readonly liveContent: PlanContent | null;
  readonly livePlanName: string | null;
  readonly proof: ProofSummary;
};
