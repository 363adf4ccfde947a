import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { PlanContent } from '@/lib/domain/site/plan';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { replacePlanContent } from '@/lib/server/plan-store';
import { PlanRow } from '@/models/plan';
import { PlanVersionRow } from '@/models/plan-version';
import { asId } from '@/lib/domain/site/ids';
import type { NewPlan } from '../schema';
import { readNewest } from './read-plan';

export const nameTaken = (name: string): AppError => new AppError('conflict', `There is a plan “${name}” already. Nothing was changed. Choose a name of its own for this one.`, {
  fields: [{ field: 'name', reason: 'Another plan has this name.' }],
});

/** Names that read alike would be mistaken for each other on a busy evening. */
export const mustBeFree = async (siteId: string, name: string, except: string | null, transaction: Transaction): Promise<void> => {
  const plans = await PlanRow.findAll({ where: { siteId }, transaction });
  if (plans.some((plan) => plan.id !== except && plan.name.toLocaleLowerCase() === name.toLocaleLowerCase())) throw nameTaken(name);
};

/** The same rules under ids of their own: each rule belongs to one plan. */
const copied = (content: PlanContent): PlanContent => ({ ...content, rules: content.rules.map((rule) => ({ ...rule, id: asId(randomUUID()) })) });

const empty: PlanContent = { offers: null, rules: [] };

/** A new plan at the end, with the rules of an old one or with none. It has no weekly times yet. */
export const createPlan = async (actor: Actor, { name, from }: NewPlan): Promise<{ readonly id: string; readonly version: number }> =>
  actIn(actor, 'plan.write', async (transaction) => {
    const { siteId, person } = actor;
    await mustBeFree(siteId, name, null, transaction);
    const source = from === null ? null : await readNewest(siteId, from, person.id, transaction);
    const content = source === null ? empty : copied(source.content);
    const id = randomUUID();
    const position = 1 + ((await PlanRow.max<number | null, PlanRow>('position', { where: { siteId }, transaction })) ?? -1);
    await PlanRow.create({ id, siteId, name, position, offersAll: content.offers === null, version: 1 }, { transaction });
    await replacePlanContent(transaction, siteId, id, content);
    const sourceName = from === null ? null : (await PlanRow.findOne({ where: { siteId, id: from }, transaction }))?.name;
    const summary = sourceName === null || sourceName === undefined ? `New plan ${name}` : `New plan ${name}, made from ${sourceName}`;
    await PlanVersionRow.create({ siteId, planId: id, number: 1, content, summary, madeBy: person.id, madeAt: new Date() }, { transaction });
    await recordChange(transaction, { siteId, personId: person.id, action: 'plan.created', subjectKind: 'plan', subjectId: id, summary });
    return { id, version: 1 };
  });
