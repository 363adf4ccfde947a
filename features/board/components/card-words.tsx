import type { Card } from '@/lib/domain/plans/board';
import styles from './board.module.css';

/** What the paper says: the name, how much, what must hold, and what differs from it. */
export function CardWords({ card, folded }: { readonly card: Card; readonly folded: boolean }) {
  const under = folded && card.kind === 'send' && card.target.kind !== 'item' ? String(card.items) : card.under;
  return (
    <>
      <b>{card.name}</b>
      <small>
        {under}
        {card.alsoAt.length === 0 ? null : `, also ${card.alsoAt.join(' ')}`}
      </small>
      {card.tags.length === 0 ? null : (
        <span className={styles['tags']}>
          {card.tags.map((tag) => <span key={tag} className={styles['tag']}>{tag}</span>)}
        </span>
      )}
      {card.notes.map((note) => <span key={note} className={styles['note']}>{note}</span>)}
    </>
  );
}
