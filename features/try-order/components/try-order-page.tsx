import type { Site } from '@/lib/domain/site/site';
import { TryOrderLoader } from './try-order-loader';
import styles from './try-order.module.css';

/** Where an order is written and its paper is seen, without a thing reaching the kitchen. */
export function TryOrderPage({ site }: { readonly site: Site }) {
  return (
    <>
      <header className={styles['head']}>
        <h1 className={styles['title']}>Try an order</h1>
        <span className={styles['practice']}>Nothing here reaches the kitchen</span>
      </header>
      <TryOrderLoader site={{ ...site, contacts: [] }} />
    </>
  );
}
