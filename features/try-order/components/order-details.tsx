'use client';

import { fromTill } from '@/lib/domain/orders/edit-order';
import type { Order } from '@/lib/domain/orders/order';
import { asId } from '@/lib/domain/site/ids';
import type { TillId } from '@/lib/domain/site/ids';
import { orderTypeWords, type OrderType } from '@/lib/domain/site/order-types';
import type { Site } from '@/lib/domain/site/site';
import type { PlanChoice } from '../plan-choices';
import type { Draft } from '../schema';
import styles from './try-order.module.css';
import type { DraftControl } from './use-draft';

const firstLetterLarge = (words: string): string => words.slice(0, 1).toUpperCase() + words.slice(1);

type DetailsProps = { readonly site: Site; readonly choices: readonly PlanChoice[]; readonly draft: Draft } & Pick<DraftControl, 'change' | 'setOrder'>;

function Under({ choices, draft, change }: Omit<DetailsProps, 'setOrder' | 'site'>) {
  const states = [['planned', 'As planned'], ['now', 'As it is now']] as const;
  return (
    <>
      <label className={styles['field']}>
        <span>Plan</span>
        <select value={draft.plan} onChange={(event) => change({ plan: event.target.value })}>
          {choices.map(({ key, words }) => <option key={key} value={key}>{words}</option>)}
        </select>
      </label>
      <fieldset className={styles['choice']}>
        <legend>Kitchen</legend>
        {states.map(([value, words]) => (
          <label key={value}>
            <input type="radio" name="present" value={value} checked={draft.present === value} onChange={() => change({ present: value })} />
            <span>{words}</span>
          </label>
        ))}
      </fieldset>
    </>
  );
}

type OrderPart = Pick<DetailsProps, 'site' | 'setOrder'> & { readonly order: Order };

function FromWhere({ site, order, setOrder }: OrderPart) {
  const till = site.tills.find(({ id }) => id === order.till);
  const areaName = site.areas.find(({ id }) => id === till?.area)?.name ?? 'The till’s own';
  return (
    <>
      <label className={styles['field']}>
        <span>Till</span>
        <select value={order.till} onChange={(event) => setOrder((now) => fromTill(now, site, asId<TillId>(event.target.value)))}>
          {site.tills.map(({ id, name }) => <option key={id} value={id}>{name}</option>)}
        </select>
      </label>
      <label className={styles['field']}>
        <span>Area</span>
        <select
          value={order.area ?? ''}
          onChange={(event) => setOrder(({ area: _, ...now }) => (event.target.value === '' ? now : { ...now, area: asId(event.target.value) }))}
        >
          <option value="">{areaName}</option>
          {site.areas.filter(({ id }) => id !== till?.area).map(({ id, name }) => <option key={id} value={id}>{name}</option>)}
        </select>
      </label>
      <label className={styles['field']}>
        <span>Order type</span>
        <select value={order.orderType} onChange={(event) => setOrder((now) => ({ ...now, orderType: event.target.value as OrderType }))}>
          {(till?.orderTypes ?? []).map((type) => <option key={type} value={type}>{firstLetterLarge(orderTypeWords[type])}</option>)}
        </select>
      </label>
    </>
  );
}

function ForWhom({ order, setOrder }: Omit<OrderPart, 'site'>) {
  return (
    <>
      <label className={styles['field']}>
        <span>Table</span>
        <input value={order.table} maxLength={40} onChange={(event) => setOrder((now) => ({ ...now, table: event.target.value }))} />
      </label>
      <label className={styles['field']}>
        <span>Covers</span>
        <input
          inputMode="numeric"
          value={order.covers ?? ''}
          maxLength={3}
          onChange={(event) => setOrder((now) => ({ ...now, covers: Number.parseInt(event.target.value, 10) || null }))}
        />
      </label>
      <label className={styles['field']}>
        <span>Server</span>
        <input value={order.server} maxLength={60} autoComplete="off" onChange={(event) => setOrder((now) => ({ ...now, server: event.target.value }))} />
      </label>
      <label className={styles['field']}>
        <span>Number</span>
        <input value={order.number} maxLength={20} onChange={(event) => setOrder((now) => ({ ...now, number: event.target.value }))} />
      </label>
    </>
  );
}

/** Under which plan and state of the kitchen, from which till, for whom: one strip above the order. */
export function OrderDetails({ site, choices, draft, change, setOrder }: DetailsProps) {
  return (
    <section className={styles['strip']} aria-label="Where the order comes from">
      <Under choices={choices} draft={draft} change={change} />
      <FromWhere site={site} order={draft.order} setOrder={setOrder} />
      <ForWhom order={draft.order} setOrder={setOrder} />
    </section>
  );
}
