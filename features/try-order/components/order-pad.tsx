'use client';

import { useState } from 'react';
import { addLine, emptyOrder } from '@/lib/domain/orders/edit-order';
import type { Order } from '@/lib/domain/orders/order';
import { newLine } from '@/lib/domain/orders/order-line';
import type { ReadyOrder } from '@/lib/domain/orders/ready-orders';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Item } from '@/lib/domain/site/menu';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { ItemSearch } from './item-search';
import { OrderLines } from './order-lines';
import { ReadyOrderList } from './ready-order-list';
import { SaidAllergies } from './said-allergies';
import styles from './try-order.module.css';
import type { DraftControl } from './use-draft';
import { counted } from './words';

type PadProps = {
  readonly site: Site;
  readonly plan: Plan;
  readonly order: Order;
  readonly tried: TriedOrder;
  readonly ready: readonly ReadyOrder[];
  readonly selected: number | null;
  readonly onSelect: (line: number | null) => void;
} & Pick<DraftControl, 'setOrder' | 'replaceOrder' | 'before'>;

/** The order as it is written: items, allergies, lines, and ways to begin again. */
export function OrderPad({ site, plan, order, tried, ready, selected, onSelect, setOrder, replaceOrder, before }: PadProps) {
  const [editing, setEditing] = useState<number | null>(null);
  const empty = order.lines.length === 0;
  const leaveLine = (): void => {
    onSelect(null);
    setEditing(null);
  };
  const put = (next: Order): void => {
    replaceOrder(next);
    leaveLine();
  };
  const add = (item: Item, quantity: number): void => {
    setOrder((now) => addLine(now, newLine(item, site, { quantity })));
    setEditing(item.optionGroups.length > 0 ? order.lines.length : null);
    onSelect(order.lines.length);
  };
  return (
    <section className={styles['order']} aria-label="Order">
      <div className={styles['orderHead']}>
        <h2>Order</h2>
        <span>{empty ? 'nothing yet' : counted(order.lines.length, 'line')}</span>
      </div>
      <ItemSearch site={site} plan={plan} onAdd={add} />
      <SaidAllergies order={order} setOrder={setOrder} />
      <OrderLines site={site} order={order} tried={tried} selected={selected} editing={editing} onSelect={onSelect} onEdit={setEditing} onRemoved={leaveLine} setOrder={setOrder} />
      {empty ? null : (
        <details className={styles['instead']}>
          <summary>Take a ready order instead</summary>
          <ReadyOrderList ready={ready} onTake={({ order: next }) => put(next)} />
        </details>
      )}
      <div className={styles['last']}>
        {empty ? null : <button type="button" className={styles['link']} onClick={() => put(emptyOrder(site))}>Clear the order</button>}
        {before === null ? null : <button type="button" className={styles['link']} onClick={() => put(before)}>Bring back the earlier order</button>}
      </div>
    </section>
  );
}
