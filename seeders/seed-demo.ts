import type { Transaction } from 'sequelize';
import { insertSite, type PlanVersionRecord } from '@/lib/server/site-store';
import { setLivePlan } from '@/lib/server/live-plan';
import { hashPassword } from '@/lib/server/password';
import { ChangeRow } from '@/models/change';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { SiteRow } from '@/models/site';
import { planId, siteOf, type DemoPlan, type DemoSite } from './demo-site';
import { lanternYard } from './lantern-yard/lantern-yard';
import { people } from './people';
import { pilgrimsOven } from './pilgrims-oven/pilgrims-oven';
import { lastStart } from './service-start';

const dayMs = 86_400_000;
const minuteMs = 60_000;

/** Who makes the plans of each site. */
const planners: readonly (readonly [DemoSite, string])[] = [[lanternYard, 'ines-okafor'], [pilgrimsOven, 'bram-okonjo']];

/** Versions up to the live one were made in the weeks before, those after it in the last hour. */
const historyOf = (plan: DemoPlan, liveVersion: number, madeBy: string, now: Date): readonly PlanVersionRecord[] =>
  plan.versions.map(({ number, content, summary }) => {
    const agoMs = number > liveVersion ? (plan.versions.length - number + 1) * 12 * minuteMs : 21 * dayMs - number * dayMs;
    return { number, content, summary, madeBy, madeAt: new Date(now.getTime() - agoMs) };
  });

const seedSite = async (transaction: Transaction, demo: DemoSite, madeBy: string, now: Date): Promise<void> => {
  const site = siteOf(demo, new Date(now.getTime() - 9 * dayMs).toISOString());
  const live = demo.plans.find((plan) => plan.name === demo.live.plan);
  if (live === undefined) throw new Error(`The demo has no plan ${demo.live.plan}.`);
  const histories = new Map(demo.plans.map((plan) => [planId(plan.name), historyOf(plan, plan === live ? demo.live.version : plan.versions.length, madeBy, now)]));
  await insertSite(transaction, site, now, (plan) => histories.get(plan.id) ?? []);
  const since = lastStart(now, live.weeklyTimes[0]?.start ?? '00:00', site.timeZone).toISOString();
  await setLivePlan(transaction, site.id, { planId: planId(live.name), version: demo.live.version, since, inForceOn: site.tills.map(({ id }) => id) }, madeBy);
  const edits = demo.plans.flatMap((plan) => (histories.get(planId(plan.name)) ?? []).map((version) => ({ plan, ...version })))
    .toSorted((left, right) => left.madeAt.getTime() - right.madeAt.getTime());
  await ChangeRow.bulkCreate(edits.map(({ plan, number, summary, madeAt }) => ({
    siteId: site.id, personId: madeBy, at: madeAt, action: 'plan.edited', subjectKind: 'plan', subjectId: planId(plan.name), summary: `${plan.name}: ${summary}`, afterValue: { version: number },
  })), { transaction });
  await SiteRow.update({ revision: edits.length }, { where: { id: site.id }, transaction });
};

/** Fills an empty database with two restaurants and their people, who all share one password. */
export const seedDemo = async (transaction: Transaction, { password, now }: { readonly password: string; readonly now: Date }): Promise<void> => {
  const hashes = await Promise.all(people.map(() => hashPassword(password)));
  await PersonRow.bulkCreate(people.map(({ id, name, email }, index) => ({ id, name, email, passwordHash: hashes[index] ?? '', createdAt: now })), { transaction });
  for (const [demo, madeBy] of planners) await seedSite(transaction, demo, madeBy, now);
  await MembershipRow.bulkCreate(people.flatMap((person) => person.memberships.map(({ site, role, title, mayOverride }) => ({ siteId: site, personId: person.id, role, title, mayOverride }))), { transaction });
};
