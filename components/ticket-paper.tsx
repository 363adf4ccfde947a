import type { CSSProperties } from 'react';
import type { Row, Run, TicketSheet } from '@/lib/domain/tickets/sheet';
import { heightOf } from '@/lib/domain/tickets/sheet';
import { cellsOf, graphemesOf } from '@/lib/domain/tickets/cells';
import styles from './ticket-paper.module.css';

/** A printer moves paper at about this speed, a line of text is so tall: the picture feeds as fast. */
const feedMmPerSecond = 150;
const rowMm = 4.23;

type Selecting = { readonly selectedLine?: number | null | undefined; readonly onSelect?: ((line: number) => void) | undefined };

type TicketPaperProps = Selecting & {
  readonly sheet: TicketSheet;
  /** For those who do not see it: "Ticket for Grill on GRILL1". */
  readonly label: string;
  /** Feeds out when it appears; later changes show at once. */
  readonly feeds?: boolean;
};

const classOf = (run: Run, sheet: TicketSheet): string => [
  styles['run'],
  run.emphasis === 'bold' ? styles['bold'] : '',
  run.emphasis === 'allergy' ? styles['allergy'] : '',
  run.emphasis === 'allergy' && sheet.emphasis !== 'frame' ? styles[sheet.emphasis] : '',
  run.width === 2 && run.height === 2 ? styles['large'] : '',
  run.width === 2 && run.height === 1 ? styles['wide'] : '',
].filter(Boolean).join(' ');

const inOurFace = /^[\u0020-\u017f]*$/u;

/** Lines of a frame, Cyrillic and other glyphs that our mono face lacks stand in a cell each. */
function OnGrid({ text }: { readonly text: string }) {
  return inOurFace.test(text) ? text : graphemesOf(text).map((grapheme, index) => <span key={index} className={styles['cell']}>{grapheme}</span>);
}

function Words({ run, sheet, selectedLine, onSelect }: Selecting & { readonly run: Run; readonly sheet: TicketSheet }) {
  const className = classOf(run, sheet);
  const [line] = run.sourceLines;
  if (line !== undefined && onSelect !== undefined) {
    const selected = selectedLine !== null && selectedLine !== undefined && run.sourceLines.includes(selectedLine);
    return (
      <button type="button" className={`${className} ${styles['name'] ?? ''} ${selected ? (styles['selected'] ?? '') : ''}`} aria-pressed={selected} onClick={() => onSelect(line)}>
        <OnGrid text={run.text} />
      </button>
    );
  }
  if (run.emphasis === 'allergy') {
    return <strong className={className} style={{ '--cells': cellsOf(run.text) } as CSSProperties}><span><OnGrid text={run.text} /></span></strong>;
  }
  return <span className={className}><OnGrid text={run.text} /></span>;
}

function PaperRow({ row, ...rest }: Selecting & { readonly row: Row; readonly sheet: TicketSheet }) {
  return <div className={styles['row']}>{row.runs.map((run, index) => <Words key={index} run={run} {...rest} />)}</div>;
}

/** A ticket as it comes out of its printer, drawn from the very rows that become its bytes. */
export function TicketPaper({ sheet, label, feeds = false, selectedLine, onSelect }: TicketPaperProps) {
  const rows = sheet.pages.reduce((sum, page) => sum + heightOf(page.rows), 0);
  const style = {
    '--columns': sheet.columns, '--feed-rows': rows, '--feed-seconds': `${((rows * rowMm) / feedMmPerSecond).toFixed(2)}s`,
  } as CSSProperties;
  return (
    <div className={styles['feed']} style={style}>
      <section aria-label={label} className={`${styles['paper'] ?? ''} ${feeds ? (styles['feeding'] ?? '') : ''}`}>
        {sheet.pages.map((page, index) => (
          <div key={index} className={styles['page']}>
            {page.rows.map((row, at) => <PaperRow key={at} row={row} sheet={sheet} selectedLine={selectedLine} onSelect={onSelect} />)}
          </div>
        ))}
        {sheet.times > 1 ? <p className={styles['unseen']}>Prints {sheet.times} times</p> : null}
      </section>
    </div>
  );
}
