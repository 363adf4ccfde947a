import type { Transaction } from 'sequelize';
import type { Site } from '@/lib/domain/site/site';
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

/** Live since the last time its service began, and in force on every till. */
const putLive = async (transaction: Transaction, { plans, live }: DemoSite, site: Site, madeBy: string, now: Date): Promise<void> => {
  const plan = plans.find(({ name }) => name === live?.plan);
  if (live === null || plan === undefined) return;
  const since = lastStart(now, plan.weeklyTimes[0]?.start ?? '00:00', site.timeZone).toISOString();
  await setLivePlan(transaction, site.id, { planId: planId(plan.name), version: live.version, since, inForceOn: site.tills.map(({ id }) => id) }, madeBy);
};

const seedSite = async (transaction: Transaction, demo: DemoSite, madeBy: string, now: Date): Promise<void> => {
  const site = siteOf(demo, new Date(now.getTime() - 9 * dayMs).toISOString());
  const histories = new Map(demo.plans.map((plan) => [planId(plan.name), historyOf(plan, demo.live?.plan === plan.name ? demo.live.version : plan.versions.length, madeBy, now)]));
  await insertSite(transaction, site, now, (plan) => histories.get(plan.id) ?? []);
  await putLive(transaction, demo, site, madeBy, now);
  const edits = site.plans.flatMap(({ id, name }) => (histories.get(id) ?? []).map((version) => ({ id, name, ...version })))
    .toSorted((left, right) => left.madeAt.getTime() - right.madeAt.getTime());
  await ChangeRow.bulkCreate(edits.map(({ id, name, number, summary, madeAt }) => ({
    siteId: site.id, personId: madeBy, at: madeAt, action: 'plan.edited', subjectKind: 'plan', subjectId: id, summary: `${name}: ${summary}`, afterValue: { version: number },
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
