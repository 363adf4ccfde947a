'use client';

import { sayOrderType } from '@/lib/domain/plans/conditions';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Conditions } from '@/lib/domain/site/plan';
import { useStore } from './board-context';

type Choice<Id extends string> = { readonly id: Id; readonly name: string };

type TicksProps<Id extends string> = {
  readonly legend: string;
  readonly choices: readonly Choice<Id>[];
  readonly ticked: readonly Id[];
  readonly change: (ticked: readonly Id[]) => void;
};

function Ticks<Id extends string>({ legend, choices, ticked, change }: TicksProps<Id>) {
  return (
    <fieldset>
      <legend className="text-[12.5px] font-semibold text-soft">{legend}</legend>
      <div className="mt-1 flex flex-wrap gap-1.5">
        {choices.map(({ id, name }) => (
          <label key={id} className="flex min-h-8 items-center gap-2 rounded-md border border-line-strong bg-raised px-2.5 has-checked:border-ink has-checked:bg-ink has-checked:text-on-ink">
            <input
              type="checkbox"
              className="size-4 accent-current"
              checked={ticked.includes(id)}
              onChange={(event) => change(event.target.checked ? [...ticked, id] : ticked.filter((other) => other !== id))}
            />
            {name}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

/** Order types, areas and tills; nothing ticked in a row means any. */
export function ConditionsFields({ value, change }: { readonly value: Conditions; readonly change: (value: Conditions) => void }) {
  const { site } = useStore();
  return (
    <div className="grid gap-3">
      <Ticks
        legend="Ordered"
        choices={orderTypes.map((orderType) => ({ id: orderType, name: `to ${sayOrderType(orderType)}`.replace('to delivery', 'for delivery') }))}
        ticked={value.orderTypes}
        change={(ticked) => change({ ...value, orderTypes: ticked })}
      />
      <Ticks legend="From the area" choices={site.areas} ticked={value.areas} change={(ticked) => change({ ...value, areas: ticked })} />
      <Ticks legend="From the till" choices={site.tills} ticked={value.tills} change={(ticked) => change({ ...value, tills: ticked })} />
    </div>
  );
}
