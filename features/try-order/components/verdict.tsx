'use client';

import type { Order } from '@/lib/domain/orders/order';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';
import { brokenLines, headline, refusedLines, unprintableWords } from './verdict-words';
import { counted } from './words';

type VerdictProps = { readonly site: Site; readonly order: Order; readonly tried: TriedOrder; readonly context: string; readonly onSelect: (line: number) => void };

/** What becomes of the order, in one sentence of large type, then what is lost and why. */
export function Verdict({ site, order, tried, context, onSelect }: VerdictProps) {
  const { tone, words } = headline(tried);
  const broken = brokenLines(site, order, tried);
  const refused = refusedLines(tried);
  return (
    <section id="tickets" className={styles['verdict']} aria-live="polite">
      <h2 className={styles[tone]}>
        <span className={styles['shape']} aria-hidden="true" />
        {words}
      </h2>
      <p className={styles['context']}>{context}. Press a dish, here or on its ticket, to see why it prints there.{refused > 0 ? ` ${counted(refused, 'refused line is', 'refused lines are')} sent nowhere.` : ''}</p>
      {tried.refusals.filter(({ line }) => line === null).map(({ message }) => <p key={message} className={styles['look']}>{message}</p>)}
      {broken.length === 0 ? null : (
        <ul className={styles['losses']}>
          {broken.map(({ first, name, quantity, reasons }) => (
            <li key={first}>
              <button type="button" onClick={() => onSelect(first)}>{quantity} {name}</button>
              {reasons.join(' ')}
            </li>
          ))}
        </ul>
      )}
      {unprintableWords(tried).map((one) => <p key={one.words} className={styles[one.allergy ? 'lost' : 'look']}>{one.words}</p>)}
    </section>
  );
}
