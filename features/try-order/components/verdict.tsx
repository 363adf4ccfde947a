'use client';

import type { Order } from '@/lib/domain/orders/order';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';
import { counted, itemName, sentencesOf } from './words';

type VerdictProps = { readonly site: Site; readonly order: Order; readonly tried: TriedOrder; readonly context: string; readonly onSelect: (line: number) => void };

const headline = (tried: TriedOrder): { readonly tone: 'well' | 'look' | 'lost'; readonly words: string } => {
  const whole = tried.refusals.find(({ line }) => line === null);
  if (whole !== undefined) return { tone: 'look', words: 'This order cannot be sent' };
  const lost = tried.lines.filter(({ outcome }) => outcome === 'lost').length;
  const part = tried.lines.filter(({ outcome }) => outcome === 'part lost').length;
  if (lost > 0) return { tone: 'lost', words: `${counted(lost, 'line')} would print nowhere` };
  if (part > 0) return { tone: 'lost', words: `${counted(part, 'line')} would print only in part` };
  if (tried.tickets.some(({ unprintable }) => unprintable.some(({ allergy }) => allergy))) return { tone: 'lost', words: 'An allergy would not print as it was said' };
  if (tried.losses.length > 0) return { tone: 'look', words: 'A copy would print nowhere' };
  const printers = new Set(tried.tickets.map(({ ticket }) => ticket.printer)).size;
  return { tone: 'well', words: printers === 0 ? 'Nothing prints for this order' : `Everything prints: ${counted(tried.tickets.length, 'ticket')} from ${counted(printers, 'printer')}` };
};

/** Each dish, printer and character once, allergies first. */
const unprintableWords = (tried: TriedOrder): readonly { readonly words: string; readonly allergy: boolean }[] => {
  const said = tried.tickets.flatMap(({ ticket, unprintable }) => unprintable.map(({ where, character, replacement, allergy }) => ({
    allergy, words: `${ticket.printerName} has no “${character}”: ${allergy ? 'the allergy' : ''} “${where}” would print with “${replacement}” instead.`.replace('  ', ' '),
  })));
  return [...new Map(said.map((one) => [one.words, one])).values()].toSorted((left, right) => Number(right.allergy) - Number(left.allergy));
};

/** What becomes of the order, in one sentence of large type, then what is lost and why. */
export function Verdict({ site, order, tried, context, onSelect }: VerdictProps) {
  const { tone, words } = headline(tried);
  const broken = tried.lines.filter(({ outcome }) => outcome === 'lost' || outcome === 'part lost');
  const refusedLines = new Set([...tried.refusals.flatMap(({ line }) => line ?? []), ...tried.lines.filter(({ outcome }) => outcome === 'refused').map(({ line }) => line)]).size;
  return (
    <section className={styles['verdict']} aria-live="polite">
      <h2 className={styles[tone]}>
        <span className={styles['shape']} aria-hidden="true" />
        {words}
      </h2>
      <p className={styles['context']}>{context}{refusedLines > 0 ? `. ${counted(refusedLines, 'line is', 'lines are')} refused and sent nowhere.` : ''}</p>
      {tried.refusals.filter(({ line }) => line === null).map(({ message }) => <p key={message} className={styles['look']}>{message}</p>)}
      {broken.length === 0 ? null : (
        <ul className={styles['losses']}>
          {broken.map(({ line }) => {
            const entry = order.lines[line];
            if (entry === undefined) return null;
            const reasons = sentencesOf(tried, line, site).filter((sentence) => sentence.tone === 'lost' && sentence.step !== 7);
            return (
              <li key={line}>
                <button type="button" onClick={() => onSelect(line)}>{entry.quantity} {itemName(site, entry)}</button>
                {reasons.map(({ subject, rest }) => <span key={subject + rest}> {subject}{rest}</span>)}
              </li>
            );
          })}
        </ul>
      )}
      {unprintableWords(tried).map((one) => <p key={one.words} className={styles[one.allergy ? 'lost' : 'look']}>{one.words}</p>)}
    </section>
  );
}
