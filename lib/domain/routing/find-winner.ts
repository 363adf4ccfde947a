import type { ItemId, OptionId } from '@/lib/domain/site/ids';
import { holds, type CompiledPlan, type CompiledRule, type Context } from './compile-plan';

const noRules: readonly CompiledRule[] = [];

const firstThatHolds = (rules: readonly CompiledRule[] | undefined, context: Context): CompiledRule | null => {
  if (rules === undefined) return null;
  for (const rule of rules) if (holds(rule, context)) return rule;
  return null;
};

/** The `send` rule that decides where an item is cooked, or null when no rule covers it in this context. */
export const findSendWinner = (plan: CompiledPlan, item: ItemId, context: Context): CompiledRule | null => {
  const section = plan.sectionOf.get(item);
  return firstThatHolds(plan.sendOnItem.get(item), context)
    ?? (section === undefined ? null : firstThatHolds(plan.sendOnSection.get(section), context))
    ?? firstThatHolds(plan.sendEverything, context);
};

/** The `split` rule that takes an option of an item to stations of its own, or null when it stays with its dish. */
export const findSplitWinner = (plan: CompiledPlan, item: ItemId, option: OptionId, context: Context): CompiledRule | null => {
  const section = plan.sectionOf.get(item);
  return firstThatHolds(plan.splitOnItem.get(option)?.get(item), context)
    ?? (section === undefined ? null : firstThatHolds(plan.splitOnSection.get(option)?.get(section), context))
    ?? firstThatHolds(plan.splitBare.get(option), context);
};

/** All `send` rules that cover an item and hold, the winner first. */
export const sendCandidates = (plan: CompiledPlan, item: ItemId, context: Context): readonly CompiledRule[] => {
  const section = plan.sectionOf.get(item);
  return [
    ...(plan.sendOnItem.get(item) ?? noRules),
    ...((section === undefined ? undefined : plan.sendOnSection.get(section)) ?? noRules),
    ...plan.sendEverything,
  ].filter((rule) => holds(rule, context));
};

/** All `split` rules for one option of an item that hold, the winner first. */
export const splitCandidates = (plan: CompiledPlan, item: ItemId, option: OptionId, context: Context): readonly CompiledRule[] => {
  const section = plan.sectionOf.get(item);
  return [
    ...(plan.splitOnItem.get(option)?.get(item) ?? noRules),
    ...((section === undefined ? undefined : plan.splitOnSection.get(option)?.get(section)) ?? noRules),
    ...(plan.splitBare.get(option) ?? noRules),
  ].filter((rule) => holds(rule, context));
};

const covers = (rule: CompiledRule, plan: CompiledPlan, item: ItemId, options: readonly OptionId[]): boolean => {
  const { target } = rule.rule;
  switch (target.kind) {
    case 'everything': return true;
    case 'section': return plan.sectionOf.get(item) === target.section;
    case 'item': return target.item === item;
    case 'option': return options.includes(target.option);
    case 'option-on-section': return options.includes(target.option) && plan.sectionOf.get(item) === target.section;
    case 'option-on-item': return options.includes(target.option) && target.item === item;
  }
};

/** All `copy` rules that cover a dish with these options and hold; copies add up, so there is no winner. */
export const copyRules = (plan: CompiledPlan, item: ItemId, options: readonly OptionId[], context: Context): readonly CompiledRule[] =>
  plan.copies.filter((rule) => covers(rule, plan, item, options) && holds(rule, context));
