import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Plan, Rule, Target } from '@/lib/domain/site/plan';
import { LiveTillRow } from '@/models/live-till';
import { PlanRow } from '@/models/plan';
import { PlanSectionRow } from '@/models/plan-section';
import { RuleRow } from '@/models/rule';
import { RuleAreaRow } from '@/models/rule-area';
import { RuleOrderTypeRow } from '@/models/rule-order-type';
import { RuleStationRow } from '@/models/rule-station';
import { RuleTillRow } from '@/models/rule-till';
import { WeeklyTimeRow } from '@/models/weekly-time';
import { groupRows, type Within } from './group-rows';

const targetOf = (row: RuleRow): Target => {
  const section = asId<never>(row.sectionId ?? '');
  const item = asId<never>(row.itemId ?? '');
  const option = asId<never>(row.optionId ?? '');
  switch (row.targetKind) {
    case 'everything': return { kind: 'everything' };
    case 'section': return { kind: 'section', section };
    case 'item': return { kind: 'item', item };
    case 'option': return { kind: 'option', option };
    case 'option-on-section': return { kind: 'option-on-section', option, section };
    case 'option-on-item': return { kind: 'option-on-item', option, item };
  }
};

const loadRules = async (within: Within): Promise<(plan: string) => readonly Rule[]> => {
  const [rules, stations, types, areas, tills] = await Promise.all([
    RuleRow.findAll({ ...within, order: ['planId', 'position'] }),
    RuleStationRow.findAll({ ...within, order: ['ruleId', 'position'] }),
    RuleOrderTypeRow.findAll(within),
    RuleAreaRow.findAll({ ...within, order: ['areaId'] }),
    RuleTillRow.findAll({ ...within, order: ['tillId'] }),
  ]);
  const stationsOf = groupRows(stations, (row) => row.ruleId);
  const typesOf = groupRows(types, (row) => row.ruleId);
  const areasOf = groupRows(areas, (row) => row.ruleId);
  const tillsOf = groupRows(tills, (row) => row.ruleId);
  const byPlan = groupRows(rules, (row) => row.planId);
  return (plan) => byPlan(plan).map((row) => ({
    id: asId(row.id), kind: row.kind, target: targetOf(row), keep: row.keep,
    stations: stationsOf(row.id).map((one) => asId(one.stationId)),
    conditions: {
      orderTypes: orderTypes.filter((type) => typesOf(row.id).some((one) => one.orderType === type)),
      areas: areasOf(row.id).map((one) => asId(one.areaId)),
      tills: tillsOf(row.id).map((one) => asId(one.tillId)),
    },
  }));
};

export const loadPlans = async (within: Within): Promise<{ readonly plans: readonly Plan[]; readonly liveTills: readonly LiveTillRow[] }> => {
  const [plans, offered, times, rulesOf, liveTills] = await Promise.all([
    PlanRow.findAll({ ...within, order: ['position', 'name'] }),
    PlanSectionRow.findAll({ ...within, order: ['sectionId'] }),
    WeeklyTimeRow.findAll({ ...within, order: ['weekday', 'start'] }),
    loadRules(within),
    LiveTillRow.findAll({ ...within, order: ['tillId'] }),
  ]);
  const offeredBy = groupRows(offered, (row) => row.planId);
  const timesOf = groupRows(times, (row) => row.planId);
  return {
    plans: plans.map((row) => ({
      id: asId(row.id), name: row.name, position: row.position, version: row.version,
      offers: row.offersAll ? null : offeredBy(row.id).map((one) => asId(one.sectionId)),
      rules: rulesOf(row.id), weeklyTimes: timesOf(row.id).map((one) => ({ weekday: one.weekday, start: one.start })),
    })),
    liveTills,
  };
};
