'use client';

import { memo, useEffect, useRef } from 'react';
import type { MouseEvent } from 'react';
import type { Card } from '@/lib/domain/plans/board';
import { cancelLift, choose, chooseThrough } from '../store/lift';
import { useBoard, useSettings, useStore } from './board-context';
import styles from './board.module.css';
import { onCardKey, swallowSpace } from './card-keys';
import { CardWords } from './card-words';
import { useOpened } from './opened';

type HangingCardProps = { readonly card: Card; readonly folded?: boolean };

const classes = (...names: readonly (string | false | undefined)[]): string =>
  names.filter((name) => name !== false && name !== undefined).join(' ');

/** Draws again only when its own words change, or when it is lifted, chosen or pointed out. */
export const HangingCard = memo(function HangingCard({ card, folded = false }: HangingCardProps) {
  const store = useStore();
  const { mayWrite } = useSettings();
  const opened = useOpened();
  const face = useRef<HTMLButtonElement>(null);
  const chosen = useBoard((state) => state.chosen.has(card.id));
  const lifted = useBoard((state) => state.lifted?.cards.includes(card.id) ?? false);
  const shown = useBoard((state) => state.shown.has(card.id));
  const settled = useBoard((state) => state.settled === card.id);
  const wanted = useBoard((state) => state.focus === card.id);

  useEffect(() => {
    if (!wanted) return;
    face.current?.focus();
    store.set((state) => ({ ...state, focus: null }));
  }, [wanted, store]);

  const press = (event: MouseEvent<HTMLButtonElement>): void => {
    const some = store.get().chosen.size > 0;
    if (mayWrite && event.shiftKey) store.set((state) => chooseThrough(state, card.id));
    else if (mayWrite && (event.ctrlKey || event.metaKey || (some && event.detail > 0))) store.set((state) => choose(state, card.id));
    else opened.open({ kind: 'card', card: card.id });
  };

  const putBack = (): void => {
    if (store.get().lifted?.by === 'keyboard') store.set((state) => ({ ...cancelLift(state), focus: null }));
  };

  return (
    <li
      data-card={card.id}
      className={classes(
        styles['card'], card.kind === 'copy' && styles['copy'], mayWrite && styles['movable'], lifted && styles['lifted'],
        chosen && styles['chosen'], shown && styles['shown'], settled && styles['settled'],
      )}
    >
      <button
        ref={face}
        type="button"
        aria-describedby={mayWrite ? 'board-keys' : undefined}
        className={styles['face']}
        onClick={press}
        onKeyDown={mayWrite ? (event) => onCardKey(event, card.id, store) : undefined}
        onKeyUp={mayWrite ? swallowSpace : undefined}
        onBlur={putBack}
      >
        <CardWords card={card} folded={folded} />
        {chosen ? <span className="sr-only">, chosen</span> : null}
      </button>
      {mayWrite ? (
        <button
          type="button"
          data-no-drag
          aria-haspopup="dialog"
          aria-label={`Send to: ${card.name}`}
          className={styles['sendTo']}
          onClick={(event) => opened.open({ kind: 'send', cards: [card.id], beside: event.currentTarget })}
        >
          Send to
        </button>
      ) : null}
    </li>
  );
});
