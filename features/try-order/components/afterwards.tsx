'use client';

import { useMemo, useState } from 'react';
import { TicketPaper } from '@/components/ticket-paper';
import type { Order } from '@/lib/domain/orders/order';
import { quantityLeft } from '@/lib/domain/orders/tab';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { PlanChoice } from '../plan-choices';
import { playEvents, type Played } from '../play-events';
import { EventButtons } from './event-buttons';
import { KitchenNow } from './kitchen-now';
import { sayEvent, sayLosses } from '../event-words';
import styles from './try-order.module.css';

type AfterwardsProps = {
  readonly site: Site;
  readonly choices: readonly PlanChoice[];
  readonly plan: Plan;
  readonly present: Present;
  readonly order: Order;
  readonly time: string;
};

/** What happens to an order once it is sent: fired, amended, voided, moved, while the kitchen changes around it. */
export function Afterwards({ site, choices, plan, present, order, time }: AfterwardsProps) {
  const [played, setPlayed] = useState<readonly Played[]>([]);
  const [now, setNow] = useState({ plan, present });
  const { tab, steps } = useMemo(() => playEvents(site, plan, present, order, played, { time }), [site, plan, present, order, played, time]);
  const play = (event: Played['event']): void => setPlayed([...played, { event, ...now }]);
  return (
    <section className={styles['afterwards']} aria-labelledby="afterwards">
      <h2 id="afterwards">And then</h2>
      <p>The order is at the stations. Change the kitchen, then do what a waiter would: word of a line follows its paper, whatever the plan says by then.</p>
      <KitchenNow site={site} choices={choices} plan={now.plan} present={now.present} change={setNow} />
      <EventButtons site={site} tab={tab} till={order.till} play={play} />
      <p className={styles['hint']}>{tab.lines.filter((line) => line.held && quantityLeft(line) > 0).length === 0 ? 'Nothing is held.' : `Held: ${tab.lines.filter((line) => line.held && quantityLeft(line) > 0).map((line) => site.menu.items.find((item) => item.id === line.line.item)?.name ?? '').join(', ')}.`}</p>
      <ol className={styles['steps']} aria-live="polite">
        {steps.map((one, index) => (
          <li key={index}>
            <h3>{index + 1}. {sayEvent(site, one, one.tab)}</h3>
            {one.printed.refusals.map((words) => <p key={words} className={styles['look']}>{words}</p>)}
            {sayLosses(site, one).map((words) => <p key={words} className={styles['lost']}>{words}</p>)}
            {one.paper.length === 0 && one.printed.refusals.length === 0 ? <p>Nothing prints.</p> : null}
            <ul className={styles['printers']}>
              {one.paper.map(({ ticket, sheet }, at) => (
                <li key={at} className={styles['printer']}>
                  <b className={styles['mouthName']}>{ticket.printerName}</b>
                  <TicketPaper sheet={sheet} feeds label={`Ticket from ${ticket.printerName}`} />
                </li>
              ))}
            </ul>
          </li>
        ))}
      </ol>
      {played.length === 0 ? null : <button type="button" className={styles['link']} onClick={() => setPlayed(played.slice(0, -1))}>Take the last one back</button>}
    </section>
  );
}
