'use client';

import dynamic from 'next/dynamic';
import { useMemo, useState } from 'react';
import { readyOrders } from '@/lib/domain/orders/ready-orders';
import { tryOrder } from '@/lib/domain/orders/try-order';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell, presentOf } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import { planChoices, planOfKey, type PlanChoice } from '../plan-choices';
import type { Draft } from '../schema';
import { OrderDetails } from './order-details';
import { OrderPad } from './order-pad';
import { Outcome } from './outcome';
import { timeOn } from './time-on';
import styles from './try-order.module.css';
import { useDraft, type DraftControl } from './use-draft';

const Afterwards = dynamic(() => import('./afterwards').then((loaded) => loaded.Afterwards), { ssr: false });

type TryProps = { readonly site: Site; readonly choices: readonly PlanChoice[]; readonly plan: Plan; readonly draft: Draft; readonly control: DraftControl };

function Trying({ site, choices, plan, draft, control: { change, ...control } }: TryProps) {
  const { order } = draft;
  const [selected, setSelected] = useState<number | null>(null);
  const [openedAt] = useState(() => timeOn(site.timeZone, new Date()));
  const ready = useMemo(() => readyOrders(site, plan), [site, plan]);
  const tried = useMemo(
    () => tryOrder(site, plan, draft.present === 'now' ? presentOf(site) : allWell, order, { time: openedAt }),
    [site, plan, draft.present, order, openedAt],
  );
  const present = draft.present === 'now' ? presentOf(site) : allWell;
  const sendable = order.lines.length > 0 && tried.refusals.length === 0;
  const shared = { site, plan, order, tried, ready, selected, onSelect: setSelected };
  return (
    <>
      <OrderDetails site={site} choices={choices} draft={draft} change={change} setOrder={control.setOrder} />
      <div className={`${styles['lane'] ?? ''} ${order.lines.length === 0 ? (styles['emptyLane'] ?? '') : ''}`}>
        <OrderPad {...shared} {...control} />
        <div>
          <Outcome {...shared} onTake={control.replaceOrder} />
          {sendable ? <Afterwards key={JSON.stringify([draft.plan, draft.present, order])} site={site} choices={choices} plan={plan} present={present} order={order} time={openedAt} /> : null}
        </div>
      </div>
    </>
  );
}

/** Write an order, see its paper and the reasons. Everything is computed here, by the engine that proves plans. */
export function TryOrder({ site, livePlan }: { readonly site: Site; readonly livePlan: Plan | null }) {
  const choices = useMemo(() => planChoices(site, livePlan), [site, livePlan]);
  const control = useDraft(site, choices);
  const { draft } = control;
  const plan = draft === null ? null : planOfKey(choices, draft.plan);
  if (site.tills.length === 0) return <p className={styles['loading']}>This site has no till to order from. Add one first.</p>;
  if (draft === null || plan === null) return <p className={styles['loading']}>This site has no plan yet. Make one on the board first.</p>;
  return <Trying site={site} choices={choices} plan={plan} draft={draft} control={control} />;
}
