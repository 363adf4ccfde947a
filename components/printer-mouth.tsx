import type { ReactNode } from 'react';
import styles from './printer-mouth.module.css';

/** The front of a printer, above the paper it feeds: its name, and whose tickets these are. */
export function PrinterMouth({ name, words, stamps }: { readonly name: string; readonly words: string; readonly stamps: ReactNode }) {
  return (
    <div className={styles['mouth']}>
      {stamps}
      <div>
        <h3 className={styles['name']}>{name}</h3>
        <span className={styles['words']}>{words}</span>
      </div>
    </div>
  );
}
