'use client';

import { useId, useState, type FormEvent } from 'react';
import { allergyWords } from '@/lib/domain/orders/allergy-words';
import { sayAllergy, seatsOf, takeBackAllergy } from '@/lib/domain/orders/edit-order';
import type { Order } from '@/lib/domain/orders/order';
import styles from './try-order.module.css';
import type { DraftControl } from './use-draft';

const whoWords = (seat: number | null): string => (seat === null ? 'table' : `seat ${seat}`);

function SayAllergy({ order, setOrder }: { readonly order: Order } & Pick<DraftControl, 'setOrder'>) {
  const listId = useId();
  const [seat, setSeat] = useState<number | null>(null);
  const [words, setWords] = useState('');
  const say = (event: FormEvent): void => {
    event.preventDefault();
    setOrder((now) => sayAllergy(now, { seat, words }));
    setWords('');
  };
  return (
    <form className={styles['say']} onSubmit={say}>
      <label className={styles['field']}>
        <span>Who</span>
        <select value={seat ?? ''} onChange={(event) => setSeat(event.target.value === '' ? null : Number(event.target.value))}>
          <option value="">Whole table</option>
          {seatsOf(order).map((number) => <option key={number} value={number}>Seat {number}</option>)}
        </select>
      </label>
      <label className={styles['field']}>
        <span>Allergy</span>
        <input list={listId} value={words} maxLength={120} placeholder="Choose or type" onChange={(event) => setWords(event.target.value)} />
        <datalist id={listId}>{Object.values(allergyWords).map((known) => <option key={known} value={known} />)}</datalist>
      </label>
      <button type="submit" className={styles['small']} disabled={words.trim() === ''}>Say it</button>
    </form>
  );
}

/** What guests said, of a seat or of the whole table; it follows their food onto every ticket. */
export function SaidAllergies({ order, setOrder }: { readonly order: Order } & Pick<DraftControl, 'setOrder'>) {
  const [open, setOpen] = useState(false);
  return (
    <div className={styles['allergies']}>
      {order.allergies.map((said) => (
        <span key={`${said.seat} ${said.words}`} className={styles['allergy']}>
          ALLERGY {whoWords(said.seat)}: {said.words.toUpperCase()}
          <button type="button" aria-label={`Take back ${said.words}, ${whoWords(said.seat)}`} onClick={() => setOrder((now) => takeBackAllergy(now, said))}>×</button>
        </span>
      ))}
      {open ? <SayAllergy order={order} setOrder={setOrder} /> : (
        <button type="button" className={styles['link']} onClick={() => setOpen(true)}>
          {order.allergies.length === 0 ? 'Add an allergy' : 'Add another allergy'}
        </button>
      )}
    </div>
  );
}
