'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { SidePanel } from '@/components/side-panel';
import { ProblemError } from '@/lib/http/client';
import { orderPlans } from '../api/change-plans';
import { useSettings } from './board-context';
import { NewPlanForm } from './panel/new-plan-form';
import { PlanEntry } from './panel/plan-entry';

/** The plans themselves: a new one from an old one, their names, their order, and when they go live by themselves. */
export function PlansPanel({ close }: { readonly close: () => void }) {
  const { plans, siteId } = useSettings();
  const router = useRouter();
  const [trouble, setTrouble] = useState('');

  const change = async (work: () => Promise<unknown>): Promise<boolean> => {
    try {
      await work();
      setTrouble('');
      router.refresh();
      return true;
    } catch (error) {
      setTrouble(error instanceof ProblemError ? error.message : 'That was not saved. Reload the page, then try again.');
      return false;
    }
  };

  const move = (from: number, to: number): void => {
    const ids = plans.map((plan) => plan.id);
    const moved = ids[from];
    if (moved !== undefined) void change(() => orderPlans(siteId, ids.toSpliced(from, 1).toSpliced(to, 0, moved)));
  };

  return (
    <SidePanel title="Plans" close={close}>
      <div className="grid gap-5">
        <p role="alert" className="font-semibold text-hot-text empty:hidden">{trouble}</p>
        <ol className="grid gap-3">
          {plans.map((plan, place) => (
            <PlanEntry
              key={`${plan.id} ${plan.name}`}
              plan={plan}
              change={change}
              up={place === 0 ? null : () => move(place, place - 1)}
              down={place === plans.length - 1 ? null : () => move(place, place + 1)}
            />
          ))}
        </ol>
        <NewPlanForm change={change} />
      </div>
    </SidePanel>
  );
}
