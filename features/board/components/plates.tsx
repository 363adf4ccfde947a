import { Tag } from '@/components/tag';
import type { Plate } from '@/lib/domain/plans/plates';
import styles from './board.module.css';
import { useFix } from './fixing';

function OnePlate({ plate, first, canFix }: { readonly plate: Plate; readonly first: boolean; readonly canFix: boolean }) {
  const fix = useFix();
  const mend = plate.wrong?.fix ?? null;
  return (
    <div className={styles['plate']}>
      <p className={styles['plateName']}>
        <span>{plate.name}</span>
        <Tag tone={plate.tag.tone}>{plate.tag.words}</Tag>
      </p>
      {first ? <p className={styles['plateWhere']}>{plate.where}</p> : null}
      {plate.wrong === null ? <p className={styles['plateQuiet']}>{plate.quiet}</p> : (
        <p className={styles['plateWrong']}>
          {plate.wrong.words}.{' '}
          {mend !== null && canFix ? (
            <button type="button" className={styles['plateFix']} onClick={() => fix.apply(mend)}>{mend.label}</button>
          ) : null}
          {mend?.kind === 'rename-printer' && !canFix ? `Use ${mend.name}.` : null}
        </p>
      )}
    </div>
  );
}

/** The printers a rail feeds, in the order they are tried. */
export function Plates({ plates, station }: { readonly plates: readonly Plate[]; readonly station: string }) {
  const { canFix } = useFix();
  const wrong = plates.some((plate) => plate.tag.tone === 'hot');
  return (
    <div className={`${styles['plates'] ?? ''} ${wrong ? (styles['wrong'] ?? '') : ''}`}>
      {plates.map((plate, place) => <OnePlate key={plate.printer} plate={plate} first={place === 0} canFix={plate.wrong?.fix != null && canFix(plate.wrong.fix)} />)}
      {plates.length === 0 ? (
        <div className={styles['plate']}>
          <p className={styles['plateWrong']}>{station} has no printer. Nothing sent here prints.</p>
        </div>
      ) : null}
    </div>
  );
}
