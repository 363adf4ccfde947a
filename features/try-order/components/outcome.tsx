'use client';

import type { Order } from '@/lib/domain/orders/order';
import type { ReadyOrder } from '@/lib/domain/orders/ready-orders';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { Printed } from './printed';
import { ReadyOrderList } from './ready-order-list';
import styles from './try-order.module.css';
import { Verdict } from './verdict';
import { headline } from './verdict-words';
import { WhyLine } from './why-line';
import { contextWords } from './words';

type OutcomeProps = {
  readonly site: Site;
  readonly plan: Plan;
  readonly order: Order;
  readonly tried: TriedOrder;
  readonly ready: readonly ReadyOrder[];
  readonly selected: number | null;
  readonly onSelect: (line: number | null) => void;
  readonly onTake: (order: Order) => void;
};

function Start({ ready, onTake }: Pick<OutcomeProps, 'ready' | 'onTake'>) {
  return (
    <section className={styles['start']}>
      <h2>Take a ready order, or add the first item</h2>
      <p>The tickets come out here, on the printers they would really come out of, with the reason for each.</p>
      <ReadyOrderList ready={ready} onTake={({ order }) => onTake(order)} />
    </section>
  );
}

/** On a phone the paper is below the pad: its verdict stays in reach. */
function Jump({ tried }: Pick<OutcomeProps, 'tried'>) {
  const { tone, words } = headline(tried);
  return <a href="#tickets" className={`${styles['jump'] ?? ''} ${styles[tone] ?? ''}`}>{words}<span>See</span></a>;
}

/** What would come out of the printers, and why; before the first item, ways to begin. */
export function Outcome({ site, plan, order, tried, ready, selected, onSelect, onTake }: OutcomeProps) {
  if (order.lines.length === 0) return <div className={styles['result']}><Start ready={ready} onTake={onTake} /></div>;
  return (
    <div className={styles['result']}>
      <Verdict site={site} order={order} tried={tried} context={contextWords(site, order, plan.name)} onSelect={onSelect} />
      <Printed site={site} tried={tried} selected={selected} onSelect={onSelect} />
      {selected === null ? <Jump tried={tried} /> : <WhyLine site={site} order={order} tried={tried} line={selected} onClose={() => onSelect(null)} />}
    </div>
  );
}
