'use client';

import { memo, useEffect, useRef } from 'react';
import { Stamp } from '@/components/stamp';
import { sayCards } from '@/lib/domain/plans/drop';
import { countWords } from '@/lib/domain/plans/words';
import type { StationId } from '@/lib/domain/site/ids';
import type { BoardState } from '../store/board-state';
import { cardsNamed, placeOf } from '../store/lift';
import { useBoard, useSettings } from './board-context';
import styles from './board.module.css';
import { HangingCard } from './hanging-card';
import { Plates } from './plates';
import type { RailStation } from './rail-station';

/** "Oysters here" while cards from elsewhere are carried over this rail; null otherwise. */
const hereWords = (state: BoardState, station: RailStation): string | null => {
  if (state.lifted?.over !== station.id) return null;
  const moved = cardsNamed(state, state.lifted.cards).filter((card) => placeOf(card) !== station.id);
  if (moved.length === 0) return null;
  return station.kind === 'pass' && moved.some((card) => card.kind === 'send') ? `Copy of ${sayCards(moved)} here` : `${sayCards(moved)} here`;
};

const railOf = (state: BoardState, station: StationId) => state.board.rails.find((rail) => rail.station === station);

function StationHead({ station, folded }: { readonly station: RailStation; readonly folded: boolean }) {
  const items = useBoard((state) => railOf(state, station.id)?.items ?? 0);
  const wholeOrder = useBoard((state) => railOf(state, station.id)?.wholeOrder ?? false);
  const copiesOnly = station.kind === 'pass' && items === 0;
  const count = copiesOnly ? (wholeOrder ? 'Whole order' : 'No whole order') : countWords(items, 'item');
  return (
    <div className={styles['head']}>
      <Stamp code={station.code} mesh={station.mesh} colour={station.colour} size={folded ? 'small' : 'medium'} />
      <div>
        <h2 id={`rail-${station.id}`} className={styles['name']}>{station.name}</h2>
        <p className={styles['quiet']}>
          {count}
          {station.kind === 'pass' ? null : <span className={styles['standIn']}>{station.standIn}</span>}
        </p>
      </div>
    </div>
  );
}

/** One station: what it is, the papers that hang from its rail, the printer it feeds. A row reads as a sentence. */
export const RailRow = memo(function RailRow({ station, folded }: { readonly station: RailStation; readonly folded: boolean }) {
  const cards = useBoard((state) => railOf(state, station.id)?.cards);
  const here = useBoard((state) => hereWords(state, station));
  const { mayWrite } = useSettings();
  const row = useRef<HTMLElement>(null);
  const carried = useBoard((state) => state.lifted?.by === 'keyboard' && state.lifted.over === station.id);
  useEffect(() => {
    if (carried) row.current?.scrollIntoView?.({ block: 'nearest' });
  }, [carried]);
  const empty = (cards?.length ?? 0) === 0 && here === null;
  return (
    <section
      ref={row}
      aria-labelledby={`rail-${station.id}`}
      data-place={station.id}
      className={`${styles['row'] ?? ''} ${folded ? (styles['folded'] ?? '') : ''} ${here === null ? '' : (styles['under'] ?? '')}`}
    >
      <StationHead station={station} folded={folded} />
      <div className={styles['rail']}>
        <ul className={styles['cards']} aria-label={station.kind === 'pass' ? `Copied to ${station.name}` : `Cooked at ${station.name}`}>
          {cards?.map((card) => <HangingCard key={card.id} card={card} folded={folded} />)}
          {here === null ? null : <li className={styles['gap']} aria-hidden>{here}</li>}
          {empty ? <li className={styles['empty']}>{mayWrite ? 'Nothing hangs here yet.' : 'Nothing hangs here.'}</li> : null}
        </ul>
      </div>
      <Plates plates={station.plates} station={station.name} />
    </section>
  );
});
