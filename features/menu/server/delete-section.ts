import 'server-only';
import { listWords } from '@/lib/domain/plans/words';
import { AppError } from '@/lib/http/errors';
import { actIn, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned } from '@/lib/server/versioned-update';
import { ItemRow } from '@/models/item';
import { PlanRow } from '@/models/plan';
import { RuleRow } from '@/models/rule';
import { SectionRow } from '@/models/section';

export type SectionDeletion = { readonly section: string; readonly version: number };

/** Only an empty section can go, and only when no plan has a rule for it, so that no plan loses a rule unseen. */
export const deleteSection = (actor: Actor, { section: id, version }: SectionDeletion): Promise<{ readonly id: string }> =>
  actIn(actor, 'menu.write', async (transaction) => {
    const { siteId } = actor;
    const items = await ItemRow.count({ where: { siteId, sectionId: id }, transaction });
    if (items > 0) throw new AppError('conflict', `This section still has ${items === 1 ? 'an item' : `${items} items`}. Nothing was deleted. Move or delete ${items === 1 ? 'it' : 'them'} first.`);
    const rules = await RuleRow.findAll({ where: { siteId, sectionId: id }, transaction });
    const plans = await PlanRow.findAll({ where: { siteId, id: [...new Set(rules.map((rule) => rule.planId))] }, order: ['position'], transaction });
    if (plans.length > 0) throw new AppError('conflict', `${listWords(plans.map((plan) => plan.name))} ${plans.length === 1 ? 'has a rule' : 'have rules'} for this section. Nothing was deleted. Take it off its stations on the board first.`);
    const row = await deleteVersioned(SectionRow, { siteId, id, version }, transaction);
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'section.deleted', subjectKind: 'section', subjectId: id, summary: `Menu section ${row.name} deleted` });
    return { id };
  });
