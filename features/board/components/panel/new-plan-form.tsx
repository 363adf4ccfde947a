'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/button';
import { createPlan } from '../../api/change-plans';
import { useSettings } from '../board-context';

const field = 'min-h-9 w-full rounded-md border border-line-strong bg-raised px-2.5 text-[14px] font-normal text-ink';

/** A new plan most often begins as another one's twin. */
export function NewPlanForm({ change }: { readonly change: (work: () => Promise<unknown>) => Promise<boolean> }) {
  const { plans, siteId, planId } = useSettings();
  const router = useRouter();
  const [name, setName] = useState('');
  const [from, setFrom] = useState(planId);
  const make = async (): Promise<void> => {
    let made = '';
    const done = await change(async () => {
      made = (await createPlan(siteId, name, from === '' ? null : from)).id;
    });
    if (done) router.push(`/sites/${siteId}/board?plan=${made}`);
  };
  return (
    <form
      className="grid gap-3 border-t border-line pt-4"
      onSubmit={(event) => {
        event.preventDefault();
        void make();
      }}
    >
      <h3 className="text-[13.5px] font-[640] font-stretch-[106%]">New plan</h3>
      <label className="grid gap-1 text-[12.5px] font-semibold text-soft">
        Name
        <input className={field} required maxLength={60} value={name} placeholder="Sunday lunch" onChange={(event) => setName(event.target.value)} />
      </label>
      <label className="grid gap-1 text-[12.5px] font-semibold text-soft">
        Begins with the rules of
        <select className={field} value={from} onChange={(event) => setFrom(event.target.value)}>
          {plans.map((plan) => <option key={plan.id} value={plan.id}>{plan.name}</option>)}
          <option value="">no plan: everything in the tray</option>
        </select>
      </label>
      <div><Button type="submit" kind="primary">Make this plan</Button></div>
    </form>
  );
}
