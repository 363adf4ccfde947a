import 'server-only';
import { checkSite } from '@/lib/domain/checks/check-site';
import type { Fix } from '@/lib/domain/findings/finding';
import { fixPermissions, mayFix } from '@/lib/domain/findings/fix-permissions';
import { boardSiteOf } from '@/lib/domain/plans/board-site';
import { platesOf, standInWords } from '@/lib/domain/plans/plates';
import { compileReach } from '@/lib/domain/reach/compile-reach';
import { summarise } from '@/lib/domain/proof/summarise';
import { may } from '@/lib/domain/roles/permissions';
import type { Plan, PlanContent } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import type { OpenSite } from '@/lib/server/page-access';
import { readPlanVersion } from '@/lib/server/plan-store';
import type { BoardView, PlanTab } from '../board-view';

const tabOf = (site: Site) => ({ id, name, version, weeklyTimes }: Plan): PlanTab => ({ id, name, version, weeklyTimes, live: site.live?.planId === id });

const liveContentOf = async (site: Site, plan: Plan): Promise<PlanContent | null> =>
  (site.live?.planId === plan.id ? readPlanVersion(site.id, plan.id, site.live.version) : null);

/** The plan asked for, else the live one, else the first; null while the site has none. */
export const planToShow = (site: Site, asked: string | undefined): Plan | null =>
  site.plans.find((plan) => plan.id === asked) ?? site.plans.find((plan) => plan.id === site.live?.planId) ?? site.plans[0] ?? null;

/** Everything that the board of one plan is drawn from, with its proof. */
export const viewBoard = async ({ site, membership }: Pick<OpenSite, 'site' | 'membership'>, plan: Plan): Promise<BoardView> => {
  const findings = checkSite(site, plan);
  const ask = compileReach(site);
  const kinds = Object.keys(fixPermissions) as Fix['kind'][];
  return {
    siteId: site.id,
    mayWrite: may(membership, 'plan.write'),
    mayFix: kinds.filter((kind) => mayFix(membership, { kind })),
    plan: tabOf(site)(plan),
    plans: site.plans.map(tabOf(site)),
    site: boardSiteOf(site),
    stations: site.stations.map((station) => ({
      id: station.id, name: station.name, code: station.code, kind: station.kind, mesh: station.mesh, colour: station.colour,
      standIn: standInWords(station, site), plates: platesOf(site, station, findings, ask),
    })),
    content: { offers: plan.offers, rules: plan.rules },
    liveContent: await liveContentOf(site, plan),
    livePlanName: site.plans.find((other) => other.id === site.live?.planId)?.name ?? null,
    proof: summarise(site, plan, findings),
  };
};
