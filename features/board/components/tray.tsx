'use client';

import { countWords } from '@/lib/domain/plans/words';
import { useBoard, useSettings } from './board-context';
import styles from './board.module.css';
import { HangingCard } from './hanging-card';

/** What prints nowhere yet. Always there while a card is carried: a card dropped here comes off its rail. */
export function Tray() {
  const cards = useBoard((state) => state.board.tray);
  const over = useBoard((state) => state.lifted?.over === 'tray' && !state.lifted.cards.every((card) => card.startsWith('tray/')));
  const { mayWrite } = useSettings();
  return (
    <section aria-labelledby="tray" data-place="tray" className={`${styles['tray'] ?? ''} ${over ? (styles['over'] ?? '') : ''}`}>
      <div className={styles['trayLabel']}>
        <h2 id="tray">Prints nowhere yet</h2>
        {cards.length === 0 ? 'Nothing' : countWords(cards.length, 'menu section')}
      </div>
      {cards.length === 0 ? null : (
        <ul className={styles['trayCards']} aria-label="Prints nowhere yet">
          {cards.map((card) => <HangingCard key={card.id} card={card} />)}
        </ul>
      )}
      {over ? <p className={styles['trayHint']}>Let go here and it comes off its rail.</p> : null}
      {over || !mayWrite ? null : (
        <p className={styles['trayHint']}>
          {cards.length === 0
            ? 'Every menu section that this plan offers hangs on a rail.'
            : <>Drag a section to a rail, or choose <b>Send to</b> on it.</>}
        </p>
      )}
    </section>
  );
}
