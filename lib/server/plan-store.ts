import 'server-only';
import type { Transaction } from 'sequelize';
import type { PlanContent, Rule } from '@/lib/domain/site/plan';
import { PlanRow } from '@/models/plan';
import { PlanSectionRow } from '@/models/plan-section';
import { PlanVersionRow } from '@/models/plan-version';
import { RuleRow } from '@/models/rule';
import { RuleAreaRow } from '@/models/rule-area';
import { RuleOrderTypeRow } from '@/models/rule-order-type';
import { RuleStationRow } from '@/models/rule-station';
import { RuleTillRow } from '@/models/rule-till';
import { recordChange } from './history';
import { updateVersioned } from './versioned-update';

const ruleRow = (siteId: string, planId: string) => (rule: Rule, position: number) => ({
  id: rule.id, siteId, planId, kind: rule.kind, targetKind: rule.target.kind, keep: rule.keep, position,
  sectionId: 'section' in rule.target ? rule.target.section : null,
  itemId: 'item' in rule.target ? rule.target.item : null,
  optionId: 'option' in rule.target ? rule.target.option : null,
});

/** Writes what a plan holds, rules in their order; whatever it held before is gone, and its versions keep it. */
export const replacePlanContent = async (transaction: Transaction, siteId: string, planId: string, content: PlanContent): Promise<void> => {
  const { rules, offers } = content;
  await RuleRow.destroy({ where: { siteId, planId }, transaction });
  await PlanSectionRow.destroy({ where: { siteId, planId }, transaction });
  await RuleRow.bulkCreate(rules.map(ruleRow(siteId, planId)), { transaction });
  await RuleStationRow.bulkCreate(rules.flatMap((rule) => rule.stations.map((stationId, position) => ({ siteId, ruleId: rule.id, position, stationId }))), { transaction });
  await RuleOrderTypeRow.bulkCreate(rules.flatMap((rule) => rule.conditions.orderTypes.map((orderType) => ({ siteId, ruleId: rule.id, orderType }))), { transaction });
  await RuleAreaRow.bulkCreate(rules.flatMap((rule) => rule.conditions.areas.map((areaId) => ({ siteId, ruleId: rule.id, areaId }))), { transaction });
  await RuleTillRow.bulkCreate(rules.flatMap((rule) => rule.conditions.tills.map((tillId) => ({ siteId, ruleId: rule.id, tillId }))), { transaction });
  await PlanSectionRow.bulkCreate((offers ?? []).map((sectionId) => ({ siteId, planId, sectionId })), { transaction });
};

export type PlanWrite = {
  readonly siteId: string;
  readonly planId: string;
  /** The version the content was made from. */
  readonly version: number;
  readonly content: PlanContent;
  /** "Oysters to Larder". */
  readonly summary: string;
  readonly personId: string | null;
};

/** Makes a plan's next version of this content. A stale version is refused and nothing is written. */
export const writePlanContent = async (transaction: Transaction, write: PlanWrite): Promise<{ readonly version: number }> => {
  const { siteId, planId, content, summary, personId } = write;
  const plan = await updateVersioned(PlanRow, { siteId, id: planId, version: write.version }, { offersAll: content.offers === null }, transaction);
  await replacePlanContent(transaction, siteId, planId, content);
  await PlanVersionRow.create({ siteId, planId, number: plan.version, content, summary: summary.slice(0, 500), madeBy: personId, madeAt: new Date() }, { transaction });
  await recordChange(transaction, { siteId, personId, action: 'plan.edited', subjectKind: 'plan', subjectId: planId, summary: `${plan.name}: ${summary}`, after: { version: plan.version } });
  return { version: plan.version };
};

/** What a plan held in one of its versions; null when it never had that one. */
export const readPlanVersion = async (siteId: string, planId: string, number: number, transaction?: Transaction): Promise<PlanContent | null> =>
  (await PlanVersionRow.findOne({ where: { siteId, planId, number }, transaction: transaction ?? null }))?.content ?? null;
