import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';

/** Stands for the plan version that is live, whichever it is; no plan has such an id. */
export const liveKey = '*';

export type PlanChoice = { readonly key: string; readonly plan: Plan; readonly words: string };

/** What an order can be tried under: what is live first, then every plan as it was last edited. */
export const planChoices = (site: Pick<Site, 'plans'>, livePlan: Plan | null): readonly PlanChoice[] => {
  const edited = site.plans.filter(({ id, version }) => id !== livePlan?.id || version !== livePlan.version);
  return [
    ...(livePlan === null ? [] : [{ key: liveKey, plan: livePlan, words: `${livePlan.name}, live` }]),
    ...edited.map((plan): PlanChoice => ({ key: plan.id, plan, words: plan.id === livePlan?.id ? `${plan.name} as edited, not live yet` : `${plan.name}, not live` })),
  ];
};

/** The plan of a kept key; a plan that has gone live meanwhile is found under either. */
export const planOfKey = (choices: readonly PlanChoice[], key: string): Plan | null =>
  (choices.find((choice) => choice.key === key) ?? choices.find(({ plan }) => plan.id === key))?.plan ?? null;
