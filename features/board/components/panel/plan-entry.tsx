'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { deletePlan, renamePlan } from '../../api/change-plans';
import type { PlanTab } from '../../board-view';
import { useSettings } from '../board-context';
import { WeeklyTimesEditor } from './weekly-times-editor';

type PlanEntryProps = {
  readonly plan: PlanTab;
  readonly change: (work: () => Promise<unknown>) => Promise<boolean>;
  readonly up: (() => void) | null;
  readonly down: (() => void) | null;
};

const quietButton = 'min-h-6 text-[13px] font-semibold underline underline-offset-3 disabled:text-quiet disabled:no-underline';

/** Deleting asks once more, in the same place: it cannot be taken back. */
function DeleteButton({ plan, change }: Pick<PlanEntryProps, 'plan' | 'change'>) {
  const { siteId, planId, plans } = useSettings();
  const router = useRouter();
  const [sure, setSure] = useState(false);
  const remove = async (): Promise<void> => {
    const done = await change(() => deletePlan(siteId, plan.id, plan.version));
    setSure(false);
    const next = plans.find((other) => other.id !== plan.id);
    if (done && plan.id === planId && next !== undefined) router.push(`/sites/${siteId}/board?plan=${next.id}`);
  };
  if (!sure) return <button type="button" aria-label={`Delete ${plan.name}`} className={quietButton} onClick={() => setSure(true)}>Delete</button>;
  return (
    <span className="flex flex-wrap gap-3">
      <button type="button" className={`${quietButton} text-hot-text`} onClick={() => void remove()}>Delete {plan.name} and its history</button>
      <button type="button" className={quietButton} onClick={() => setSure(false)}>Keep it</button>
    </span>
  );
}

export function PlanEntry({ plan, change, up, down }: PlanEntryProps) {
  const { siteId } = useSettings();
  const [name, setName] = useState(plan.name);
  return (
    <li className="grid gap-2 rounded-lg border border-line bg-raised p-3">
      <form
        className="flex items-center gap-2"
        onSubmit={(event) => {
          event.preventDefault();
          void change(() => renamePlan(siteId, plan.id, name, plan.name));
        }}
      >
        <input
          aria-label={`Name of ${plan.name}`}
          className="min-h-9 min-w-0 flex-1 rounded-md border border-line-strong bg-raised px-2.5 font-semibold"
          required
          maxLength={60}
          value={name}
          onChange={(event) => setName(event.target.value)}
        />
        {name === plan.name ? null : <button type="submit" className={quietButton}>Rename</button>}
        {plan.live ? <span className="text-[12.5px] font-semibold text-calm-text">live now</span> : null}
      </form>
      <WeeklyTimesEditor plan={plan} change={change} />
      <div className="flex flex-wrap gap-x-4 gap-y-1">
        <button type="button" aria-label={`${plan.name} earlier`} disabled={up === null} className={quietButton} onClick={() => up?.()}>Earlier</button>
        <button type="button" aria-label={`${plan.name} later`} disabled={down === null} className={quietButton} onClick={() => down?.()}>Later</button>
        {plan.live ? null : <DeleteButton plan={plan} change={change} />}
      </div>
    </li>
  );
}
