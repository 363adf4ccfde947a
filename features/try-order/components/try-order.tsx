'use client';

import { useMemo, useState } from 'react';
import { addLine, emptyOrder } from '@/lib/domain/orders/edit-order';
import { newLine } from '@/lib/domain/orders/order-line';
import type { Order } from '@/lib/domain/orders/order';
import { readyOrders, type ReadyOrder } from '@/lib/domain/orders/ready-orders';
import { tryOrder } from '@/lib/domain/orders/try-order';
import type { Item } from '@/lib/domain/site/menu';
import type { Plan } from '@/lib/domain/site/plan';
import { allWell, presentOf } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { Draft } from '../schema';
import { ItemSearch } from './item-search';
import { OrderDetails } from './order-details';
import { OrderLines } from './order-lines';
import { Printed } from './printed';
import { ReadyOrderList } from './ready-order-list';
import { SaidAllergies } from './said-allergies';
import { timeOn } from './time-on';
import styles from './try-order.module.css';
import { useDraft, type DraftControl } from './use-draft';
import { headline, Verdict } from './verdict';
import { WhyLine } from './why-line';
import { contextWords, counted } from './words';

type PadProps = { readonly site: Site; readonly plan: Plan; readonly draft: Draft; readonly control: DraftControl };

function Pad({ site, plan, draft, control }: PadProps) {
  const { order } = draft;
  const { change, setOrder, replaceOrder, before } = control;
  const [selected, setSelected] = useState<number | null>(null);
  const [editing, setEditing] = useState<number | null>(null);
  const [openedAt] = useState(() => timeOn(site.timeZone, new Date()));
  const ready = useMemo(() => readyOrders(site, plan), [site, plan]);
  const tried = useMemo(
    () => tryOrder(site, plan, draft.present === 'now' ? presentOf(site) : allWell, order, { time: openedAt }),
    [site, plan, draft.present, order, openedAt],
  );
  const verdict = headline(tried);
  const empty = order.lines.length === 0;

  const leaveLine = (): void => {
    setSelected(null);
    setEditing(null);
  };
  const put = (next: Order): void => {
    replaceOrder(next);
    leaveLine();
  };
  const take = ({ order: next }: ReadyOrder): void => put(next);
  const add = (item: Item, quantity: number): void => {
    setOrder((now) => addLine(now, newLine(item, site, { quantity })));
    setEditing(item.optionGroups.length > 0 ? order.lines.length : null);
    setSelected(order.lines.length);
  };
  return (
    <div className={`${styles['lane'] ?? ''} ${empty ? (styles['emptyLane'] ?? '') : ''}`}>
      <section className={styles['order']} aria-label="Order">
        <OrderDetails site={site} draft={draft} change={change} setOrder={setOrder} />
        <div className={styles['orderHead']}>
          <h2>Order</h2>
          <span>{empty ? 'nothing yet' : counted(order.lines.length, 'line')}</span>
        </div>
        <ItemSearch site={site} plan={plan} onAdd={add} />
        <SaidAllergies order={order} setOrder={setOrder} />
        <OrderLines site={site} order={order} tried={tried} selected={selected} editing={editing} onSelect={setSelected} onEdit={setEditing} onRemoved={leaveLine} setOrder={setOrder} />
        {empty ? null : (
          <details className={styles['instead']}>
            <summary>Take a ready order instead</summary>
            <ReadyOrderList ready={ready} onTake={take} />
          </details>
        )}
        <div className={styles['last']}>
          {empty ? null : <button type="button" className={styles['link']} onClick={() => put(emptyOrder(site))}>Clear the order</button>}
          {before === null ? null : <button type="button" className={styles['link']} onClick={() => put(before)}>Bring back the earlier order</button>}
        </div>
      </section>
      <div className={styles['result']}>
        {empty ? (
          <section className={styles['start']}>
            <h2>Take a ready order, or add the first item</h2>
            <p>The tickets come out here, on the printers they would really come out of, with the reason for each.</p>
            <ReadyOrderList ready={ready} onTake={take} />
          </section>
        ) : (
          <>
            <Verdict site={site} order={order} tried={tried} context={contextWords(site, order, plan.name)} onSelect={setSelected} />
            <Printed site={site} tried={tried} selected={selected} onSelect={setSelected} />
            {selected === null ? <a href="#tickets" className={`${styles['jump'] ?? ''} ${styles[verdict.tone] ?? ''}`}>{verdict.words}<span>See</span></a> : <WhyLine site={site} order={order} tried={tried} line={selected} onClose={() => setSelected(null)} />}
          </>
        )}
      </div>
    </div>
  );
}

/** Write an order, see its paper and the reasons. Everything is computed here, by the engine that proves plans. */
export function TryOrder({ site }: { readonly site: Site }) {
  const control = useDraft(site);
  const { draft } = control;
  const plan = site.plans.find(({ id }) => id === draft?.plan);
  if (draft === null || plan === undefined || site.tills.length === 0) {
    return <p className={styles['loading']}>{site.tills.length === 0 ? 'This site has no till to order from. Add one first.' : 'This site has no plan yet. Make one on the board first.'}</p>;
  }
  return <Pad site={site} plan={plan} draft={draft} control={control} />;
}
