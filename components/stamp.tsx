import type { Mesh, StationColour } from '@/lib/domain/site/station';
import styles from './stamp.module.css';

type StampProps = {
  readonly code: string;
  readonly mesh: Mesh;
  readonly colour: StationColour;
  readonly size?: 'small' | 'medium' | 'large';
};

/** A station is known by code and mesh, beside its name; the colour only helps. */
export function Stamp({ code, mesh, colour, size = 'medium' }: StampProps) {
  return (
    <span aria-hidden className={`${styles['stamp']} ${styles[size]} ${styles[colour]}`}>
      <i className={styles[mesh]} />
      <span>{code}</span>
    </span>
  );
}
