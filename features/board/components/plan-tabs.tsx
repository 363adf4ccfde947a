import Link from 'next/link';

type PlanTabsProps = {
  readonly siteId: string;
  readonly plans: readonly { readonly id: string; readonly name: string; readonly live: boolean }[];
  readonly shown: string;
};

/** One tab a plan; the live one says so beside its name. */
export function PlanTabs({ siteId, plans, shown }: PlanTabsProps) {
  return (
    <nav aria-label="Plans" className="flex max-w-full overflow-x-auto rounded-[7px] border border-line-strong bg-raised">
      {plans.map((plan) => (
        <Link
          key={plan.id}
          href={`/sites/${siteId}/board?plan=${plan.id}`}
          aria-current={plan.id === shown ? 'page' : undefined}
          className="flex items-center gap-1.5 border-r border-line px-3.5 py-[9px] text-[13.5px] leading-tight font-medium whitespace-nowrap text-soft last:border-r-0 aria-[current=page]:bg-ink aria-[current=page]:font-semibold aria-[current=page]:text-on-ink"
        >
          {plan.name}
          {plan.live ? <span className="size-2 rounded-full bg-current" title="Live now"><span className="sr-only">, live now</span></span> : null}
        </Link>
      ))}
    </nav>
  );
}
