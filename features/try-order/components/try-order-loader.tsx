'use client';

import dynamic from 'next/dynamic';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';

/** The engine, the paper and the order pad arrive after first paint. */
const TryOrder = dynamic(() => import('./try-order').then((loaded) => loaded.TryOrder), {
  ssr: false,
  loading: () => <p className={styles['loading']} role="status">Laying out the order pad</p>,
});

export function TryOrderLoader(props: { readonly site: Site; readonly livePlan: Plan | null }) {
  return <TryOrder {...props} />;
}
