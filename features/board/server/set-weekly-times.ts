import 'server-only';
import type { Transaction } from 'sequelize';
import type { WeeklyTime } from '@/lib/domain/site/plan';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { lastChangeOf, recordChange } from '@/lib/server/history';
import { PlanRow } from '@/models/plan';
import { WeeklyTimeRow } from '@/models/weekly-time';
import type { WeeklyTimes } from '../schema';
import { sayWeeklyTime } from '../weekly-words';
import { planMissing } from './read-plan';

const keyOf = (time: WeeklyTime): string => `${time.weekday} ${time.start}`;
const keysOf = (times: readonly WeeklyTime[]): readonly string[] => [...new Set(times.map(keyOf))].toSorted();

/** Two plans cannot start at the same minute: one of them would never be live. */
const mustBeAlone = async (siteId: string, planId: string, times: readonly WeeklyTime[], transaction: Transaction): Promise<void> => {
  const others = (await WeeklyTimeRow.findAll({ where: { siteId }, transaction, lock: transaction.LOCK.UPDATE })).filter((row) => row.planId !== planId);
  const clash = times.find((time) => others.some((other) => keyOf(other) === keyOf(time)));
  if (clash === undefined) return;
  const other = others.find((row) => keyOf(row) === keyOf(clash));
  const name = (await PlanRow.findOne({ where: { siteId, id: other?.planId ?? '' }, transaction }))?.name ?? 'Another plan';
  throw new AppError('conflict', `${name} starts at ${sayWeeklyTime(clash)} already. Nothing was changed. Choose another time, or remove that one from ${name} first.`, {
    fields: [{ field: `weeklyTimes.${times.indexOf(clash)}.start`, reason: `${name} starts then.` }],
  });
};

/** When a plan goes live by itself, week by week. The version of its content stays. */
export const setWeeklyTimes = async (actor: Actor, planId: string, { weeklyTimes, was }: WeeklyTimes): Promise<{ readonly weeklyTimes: readonly WeeklyTime[] }> =>
  actIn(actor, 'plan.write', async (transaction) => {
    const { siteId, person } = actor;
    const plan = await PlanRow.findOne({ where: { siteId, id: planId }, transaction, lock: transaction.LOCK.UPDATE });
    if (plan === null) throw planMissing();
    const standing = (await WeeklyTimeRow.findAll({ where: { siteId, planId }, transaction })).map(({ weekday, start }) => ({ weekday, start }));
    if (keysOf(standing).join() !== keysOf(was).join()) {
      throw new AppError('stale', 'Somebody changed these times since you opened them, so yours were not saved. Reload the page, then set them again.', {
        changed: await lastChangeOf(siteId, 'plan', planId, transaction), current: { weeklyTimes: standing },
      });
    }
    const next = weeklyTimes.filter((time, place) => weeklyTimes.findIndex((other) => keyOf(other) === keyOf(time)) === place);
    await mustBeAlone(siteId, planId, next, transaction);
    await WeeklyTimeRow.destroy({ where: { siteId, planId }, transaction });
    await WeeklyTimeRow.bulkCreate(next.map(({ weekday, start }) => ({ siteId, planId, weekday, start })), { transaction });
    const summary = next.length === 0 ? `${plan.name} has no weekly times` : `${plan.name} starts ${next.map(sayWeeklyTime).join(', ')}`;
    await recordChange(transaction, { siteId, personId: person.id, action: 'plan.timed', subjectKind: 'plan', subjectId: planId, summary, before: { weeklyTimes: standing }, after: { weeklyTimes: next } });
    return { weeklyTimes: next };
  });
