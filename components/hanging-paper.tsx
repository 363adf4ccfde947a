import type { ReactNode } from 'react';
import styles from './hanging-paper.module.css';

/** A sheet that hangs by its clip; whoever places it puts a rail behind its top edge. */
export function HangingPaper({ className = '', children }: { readonly className?: string; readonly children: ReactNode }) {
  return (
    <div className={`on-paper ${styles['hung']} ${className}`}>
      <i aria-hidden className={styles['clip']} />
      {children}
    </div>
  );
}

export type Hung = { readonly id: string; readonly paper: ReactNode };

/** A list whose entries hang side by side from one rail, and from another where they go on below. */
export function HangingList({ hung }: { readonly hung: readonly Hung[] }) {
  return (
    <ul className={styles['line']}>
      {hung.map(({ id, paper }) => <li key={id} className={styles['place']}><HangingPaper>{paper}</HangingPaper></li>)}
    </ul>
  );
}
