import { bySeverity } from '@/lib/domain/findings/finding';
import { compilePlan } from '@/lib/domain/routing/compile-plan';
import { reachesOf, routingUnder } from '@/lib/domain/routing/routing';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell, type Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { enumerateWays } from './enumerate-ways';
import { judgeWith, type Judgement } from './judge';
import { lossFindings } from './loss-findings';
import { reachFindings } from './reach-findings';
import { ruleFindings } from './rule-findings';
import type { ProofFinding } from './summary';
import type { Ways } from './way';

/** The check of a whole plan: every line that could ever be ordered, from every till. */
export type Proof = {
  readonly ways: Ways;
  /** One for each class of ways, in their order. */
  readonly judgements: readonly Judgement[];
  /** Worst first. */
  readonly findings: readonly ProofFinding[];
};

/**
 * Proves a plan. With `allWell` it is the plan proof; with the present state it is the proof of now.
 * Same site, plan and state: same proof, always.
 */
export const provePlan = (site: Site, plan: Plan, present: Present = allWell): Proof => {
  const compiled = compilePlan(site, plan);
  const ways = enumerateWays(site, plan, present.diverts, compiled);
  const routing = routingUnder(site, compiled, present, reachesOf(site, present));
  const { judge } = judgeWith(routing);
  const off = new Set(present.offTills);
  const judgements = ways.classes.filter((one) => !off.has(one.till)).map(judge);
  return {
    ways,
    judgements,
    findings: bySeverity<ProofFinding>([
      ...lossFindings(site, plan, judgements),
      ...ruleFindings(site, plan, ways),
      ...reachFindings(site, judgements),
    ]),
  };
};
