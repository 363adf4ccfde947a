'use client';

import type { ReadyOrder } from '@/lib/domain/orders/ready-orders';
import styles from './try-order.module.css';

/** Six orders made from this menu, one press each. */
export function ReadyOrderList({ ready, onTake }: { readonly ready: readonly ReadyOrder[]; readonly onTake: (order: ReadyOrder) => void }) {
  return (
    <ul className={styles['ready']}>
      {ready.filter(({ order }) => order.lines.length > 0).map((one) => (
        <li key={one.key}>
          <button type="button" onClick={() => onTake(one)}>
            <b>{one.name}</b>
            <small>{one.says}</small>
          </button>
        </li>
      ))}
    </ul>
  );
}
