import { z } from 'zod';
import type { AreaId, ItemId, OptionId, PlanId, RuleId, SectionId, StationId, TillId } from '@/lib/domain/site/ids';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { PlanContent, WeeklyTime } from '@/lib/domain/site/plan';

const id = <Id extends string>() => z.string().regex(/^[A-Za-z0-9._-]{1,36}$/, 'This is not an id.').transform((value) => value as Id);

const everything = z.strictObject({ kind: z.literal('everything') });
const section = z.strictObject({ kind: z.literal('section'), section: id<SectionId>() });
const item = z.strictObject({ kind: z.literal('item'), item: id<ItemId>() });
const option = z.strictObject({ kind: z.literal('option'), option: id<OptionId>() });
const optionOnSection = z.strictObject({ kind: z.literal('option-on-section'), option: id<OptionId>(), section: id<SectionId>() });
const optionOnItem = z.strictObject({ kind: z.literal('option-on-item'), option: id<OptionId>(), item: id<ItemId>() });

const conditions = z.strictObject({
  orderTypes: z.array(z.enum(orderTypes)).max(orderTypes.length),
  areas: z.array(id<AreaId>()).max(200),
  tills: z.array(id<TillId>()).max(500),
});

const rest = {
  id: id<RuleId>(),
  conditions,
  stations: z.array(id<StationId>()).min(1, 'A rule sends to at least one station.').max(100),
};

const rule = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('send'), target: z.discriminatedUnion('kind', [everything, section, item]), keep: z.literal(false), ...rest }),
  z.strictObject({ kind: z.literal('split'), target: z.discriminatedUnion('kind', [option, optionOnSection, optionOnItem]), keep: z.boolean(), ...rest }),
  z.strictObject({ kind: z.literal('copy'), target: z.discriminatedUnion('kind', [everything, section, item, option]), keep: z.literal(false), ...rest }),
]);

export const planContentSchema: z.ZodType<PlanContent> = z.strictObject({
  offers: z.array(id<SectionId>()).max(2_000).nullable(),
  rules: z.array(rule).max(10_000),
});

export const planParams = z.object({ site: z.string(), plan: id<PlanId>() });

export const changePlanBody = z.strictObject({
  content: planContentSchema,
  /** What the person did, for the history. */
  summary: z.string().trim().min(1).max(2_000),
});

export const planName = z.string().trim().min(1, 'A plan needs a name: the service it is for.').max(60, 'A plan’s name has at most 60 characters.');

export const newPlanBody = z.strictObject({
  name: planName,
  /** The plan whose rules it starts with; null starts with none. */
  from: id<PlanId>().nullable(),
});

/** `was` is the name that was read: of two people who rename at once, one is told. */
export const renamePlanBody = z.strictObject({ name: planName, was: z.string() });

export const orderPlansBody = z.strictObject({ plans: z.array(id<PlanId>()).min(1).max(200) });

const weeklyTime = z.strictObject({
  weekday: z.int().min(1).max(7),
  start: z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Write the time as 17:30, from 00:00 to 23:59.'),
});

export const weeklyTimesBody = z.strictObject({ weeklyTimes: z.array(weeklyTime).max(200), was: z.array(weeklyTime).max(200) });

export type NewPlan = { readonly name: string; readonly from: string | null };
export type RenamePlan = { readonly name: string; readonly was: string };
export type WeeklyTimes = { readonly weeklyTimes: readonly WeeklyTime[]; readonly was: readonly WeeklyTime[] };
