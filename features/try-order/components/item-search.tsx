'use client';

import { useId, useState, type KeyboardEvent } from 'react';
import { findItems, readSearch } from '@/lib/domain/orders/find-items';
import type { Item } from '@/lib/domain/site/menu';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';

const mostShown = 40;

const standingWords = (item: Item, plan: Plan): string => {
  if (plan.offers !== null && !plan.offers.includes(item.section)) return 'not offered';
  if (item.soldOut || item.left === 0) return 'sold out';
  return item.left === null ? '' : `${item.left} left`;
};

type SearchProps = { readonly site: Site; readonly plan: Plan; readonly onAdd: (item: Item, quantity: number) => void };

/** Type part of a name, "3 crab" for three; arrows choose, Enter adds, Escape closes. */
export function ItemSearch({ site, plan, onAdd }: SearchProps) {
  const listId = useId();
  const [typed, setTyped] = useState('');
  const [open, setOpen] = useState(false);
  const [at, setAt] = useState(0);
  const sought = readSearch(typed);
  const found = open ? findItems(site.menu, sought).slice(0, mostShown) : [];
  const sections = new Map(site.menu.sections.map(({ id, name }) => [id, name]));
  const active = found[Math.min(at, found.length - 1)];

  const add = (item: Item): void => {
    onAdd(item, sought.quantity);
    setTyped('');
    setAt(0);
    setOpen(false);
  };
  const move = (step: number): void => {
    setOpen(true);
    if (open && found.length > 0) setAt((now) => (Math.min(now, found.length - 1) + step + found.length) % found.length);
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === 'ArrowDown') move(1);
    else if (event.key === 'ArrowUp') move(-1);
    else if (event.key === 'Enter' && active !== undefined) add(active);
    else if (event.key === 'Escape') setOpen(false);
    else return;
    event.preventDefault();
  };
  return (
    <div className={styles['search']}>
      <label className={styles['field']}>
        <span>Add an item</span>
        <input
          role="combobox"
          aria-expanded={found.length > 0}
          aria-controls={listId}
          aria-autocomplete="list"
          aria-activedescendant={active === undefined ? undefined : `${listId}-${active.id}`}
          autoComplete="off"
          placeholder="Crab, or 3 crab for three"
          value={typed}
          onChange={(event) => { setTyped(event.target.value); setAt(0); setOpen(true); }}
          onFocus={() => setOpen(true)}
          onBlur={() => setOpen(false)}
          onKeyDown={onKeyDown}
        />
      </label>
      <ul id={listId} role="listbox" aria-label="Items" className={styles['found']} hidden={found.length === 0}>
        {found.map((item) => (
          <li
            key={item.id}
            id={`${listId}-${item.id}`}
            role="option"
            aria-selected={item === active}
            ref={item === active ? (element) => element?.scrollIntoView({ block: 'nearest' }) : undefined}
            onMouseDown={(event) => event.preventDefault()}
            onClick={() => add(item)}
          >
            <span>{sought.quantity > 1 ? <b>{sought.quantity} </b> : null}{item.name}</span>
            <small>{[sections.get(item.section), standingWords(item, plan)].filter(Boolean).join(', ')}</small>
          </li>
        ))}
      </ul>
      {open && typed.trim() !== '' && found.length === 0 ? <p className={styles['hint']} role="status">No item has “{typed.trim()}” in its name.</p> : null}
    </div>
  );
}
