'use client';

import type { Order } from '@/lib/domain/orders/order';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Site } from '@/lib/domain/site/site';
import { LinePath } from './line-path';
import styles from './try-order.module.css';
import { counted, itemName, lineState, sentencesOf, ticketsOfLine } from './words';

type WhyProps = { readonly site: Site; readonly order: Order; readonly tried: TriedOrder; readonly line: number; readonly onClose: () => void };

const titleWords = (tried: TriedOrder, line: number, name: string): string => {
  const outcome = tried.lines.find((routed) => routed.line === line)?.outcome;
  if (outcome === undefined || outcome === 'refused') return `Why ${name} is refused`;
  if (outcome === 'no ticket') return `Why ${name} prints nothing`;
  if (outcome === 'lost') return `Why ${name} prints nowhere`;
  return `Why ${name} is on ${counted(ticketsOfLine(tried, line), 'ticket')}`;
};

/** The steps that one line went through, in words, beside a picture of its way. */
export function WhyLine({ site, order, tried, line, onClose }: WhyProps) {
  const entry = order.lines[line];
  if (entry === undefined) return null;
  const route = tried.lines.find((routed) => routed.line === line)?.route ?? null;
  const sentences = sentencesOf(tried, line, site);
  return (
    <aside className={styles['why']} aria-label="Why it prints there">
      <div className={styles['whyHead']}>
        <h2>{titleWords(tried, line, itemName(site, entry))}</h2>
        <button type="button" className={styles['link']} onClick={onClose}>Close</button>
      </div>
      <div className={styles['whyBody']}>
        {route === null ? <p>{lineState(tried, line)?.words}</p> : (
          <ol className={styles['steps']}>
            {sentences.map((sentence, index) => (
              <li key={index} className={styles[`${sentence.tone}Step`]}><b>{sentence.subject}</b>{sentence.rest}</li>
            ))}
          </ol>
        )}
        {route === null ? null : <LinePath route={route} site={site} />}
      </div>
    </aside>
  );
}
