'use client';

import { changeLine, removeLine, sayAllergy, seatsOf } from '@/lib/domain/orders/edit-order';
import { allergyInNote } from '@/lib/domain/orders/allergy-in-note';
import type { Order, OrderLine } from '@/lib/domain/orders/order';
import { largestQuantity } from '@/lib/domain/orders/refuse-order';
import { asId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import { LineOptions } from './line-options';
import styles from './try-order.module.css';
import type { DraftControl } from './use-draft';

type EditorProps = { readonly site: Site; readonly order: Order; readonly line: OrderLine; readonly index: number; readonly onRemoved: () => void } & Pick<DraftControl, 'setOrder'>;

type PartProps = Pick<EditorProps, 'line'> & { readonly onChange: (change: Partial<OrderLine>) => void };

function Quantity({ line, onChange }: PartProps) {
  const step = (by: number): void => onChange({ quantity: Math.min(largestQuantity, Math.max(1, line.quantity + by)) });
  return (
    <div className={styles['stepper']} role="group" aria-label="Quantity">
      <button type="button" aria-label="One less" disabled={line.quantity <= 1} onClick={() => step(-1)}>−</button>
      <input aria-label="Quantity" inputMode="numeric" maxLength={4} value={line.quantity === 0 ? '' : line.quantity} onChange={(event) => onChange({ quantity: Number.parseInt(event.target.value, 10) || 0 })} />
      <button type="button" aria-label="One more" disabled={line.quantity >= largestQuantity} onClick={() => step(1)}>+</button>
    </div>
  );
}

function Note({ line, onChange, onAllergy }: PartProps & { readonly onAllergy: (words: string) => void }) {
  const offered = allergyInNote(line.note);
  const said = offered !== null && line.allergies.includes(offered);
  return (
    <>
      <label className={styles['field']}>
        <span>Note</span>
        <input value={line.note} maxLength={300} placeholder="As the kitchen should read it" onChange={(event) => onChange({ note: event.target.value })} />
      </label>
      {offered === null || said ? null : (
        <p className={styles['offer']}>
          This note looks like an allergy.
          <button type="button" className={styles['small']} onClick={() => onAllergy(offered)}>Say it as an allergy: {offered}</button>
        </p>
      )}
    </>
  );
}

/** Everything about one line of the order, in place. */
export function LineEditor({ site, order, line, index, setOrder, onRemoved }: EditorProps) {
  const onChange = (change: Partial<OrderLine>): void => setOrder((now) => changeLine(now, index, change));
  const item = site.menu.items.find(({ id }) => id === line.item);
  const own = site.courses.find(({ id }) => id === item?.course);
  const sayOf = (words: string): void => setOrder((now) => (line.seat === null
    ? changeLine(now, index, { allergies: [...line.allergies, words] })
    : sayAllergy(now, { seat: line.seat, words })));
  return (
    <div className={styles['editor']}>
      <div className={styles['quick']}>
        <Quantity line={line} onChange={onChange} />
        <label className={styles['field']}>
          <span>For</span>
          <select value={line.seat ?? ''} onChange={(event) => onChange({ seat: event.target.value === '' ? null : Number(event.target.value) })}>
            <option value="">Table</option>
            {seatsOf(order).map((seat) => <option key={seat} value={seat}>Seat {seat}</option>)}
          </select>
        </label>
        <label className={styles['field']}>
          <span>Course</span>
          <select value={line.course ?? ''} onChange={(event) => onChange({ course: event.target.value === '' ? null : asId(event.target.value) })}>
            <option value="">{own === undefined ? 'None' : own.name}</option>
            {site.courses.filter(({ id }) => id !== own?.id).map(({ id, name }) => <option key={id} value={id}>{name}</option>)}
          </select>
        </label>
      </div>
      <LineOptions site={site} line={line} index={index} onChange={onChange} />
      <Note line={line} onChange={onChange} onAllergy={sayOf} />
      {line.allergies.map((words) => (
        <span key={words} className={styles['allergy']}>
          ALLERGY this line: {words.toUpperCase()}
          <button type="button" aria-label={`Take back ${words}`} onClick={() => onChange({ allergies: line.allergies.filter((known) => known !== words) })}>×</button>
        </span>
      ))}
      <div className={styles['last']}>
        <label className={styles['held']}>
          <input type="checkbox" checked={line.held ?? false} onChange={(event) => onChange({ held: event.target.checked })} />
          <span>Held until its course is fired</span>
        </label>
        <button type="button" className={styles['link']} onClick={() => { setOrder((now) => removeLine(now, index)); onRemoved(); }}>Remove</button>
      </div>
    </div>
  );
}
