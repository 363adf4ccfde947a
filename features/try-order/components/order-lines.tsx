'use client';

import type { Order } from '@/lib/domain/orders/order';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Site } from '@/lib/domain/site/site';
import { LineEditor } from './line-editor';
import styles from './try-order.module.css';
import type { DraftControl } from './use-draft';
import { itemName, lineDetail, lineState } from './words';

type LinesProps = {
  readonly site: Site;
  readonly order: Order;
  readonly tried: TriedOrder;
  readonly selected: number | null;
  readonly editing: number | null;
  readonly onSelect: (line: number) => void;
  readonly onEdit: (line: number | null) => void;
  readonly onRemoved: () => void;
} & Pick<DraftControl, 'setOrder'>;

/** The order as written; pressing a line asks where it prints and why. */
export function OrderLines({ site, order, tried, selected, editing, onSelect, onEdit, onRemoved, setOrder }: LinesProps) {
  return (
    <ol className={styles['lines']} aria-label="Lines of the order">
      {order.lines.map((line, index) => {
        const state = lineState(tried, index);
        const met = tried.allergensMet.filter((one) => one.line === index);
        const name = itemName(site, line);
        return (
          <li key={index} className={`${styles['line'] ?? ''} ${selected === index ? (styles['chosen'] ?? '') : ''}`}>
            <button type="button" className={styles['pick']} aria-pressed={selected === index} onClick={() => onSelect(index)}>
              <b>{line.quantity}</b>
              <span>
                {name}
                <small>{lineDetail(site, line)}</small>
                {state === null ? null : <small className={styles[state.tone]}>{state.words}</small>}
                {met.map((one) => <small key={one.message} className={styles['look']}>{one.message}</small>)}
              </span>
            </button>
            <button type="button" className={styles['change']} aria-expanded={editing === index} aria-label={`${editing === index ? 'Close' : 'Change'} ${name}`} onClick={() => onEdit(editing === index ? null : index)}>
              {editing === index ? 'Done' : 'Change'}
            </button>
            {editing === index ? <LineEditor site={site} order={order} line={line} index={index} setOrder={setOrder} onRemoved={onRemoved} /> : null}
          </li>
        );
      })}
    </ol>
  );
}
