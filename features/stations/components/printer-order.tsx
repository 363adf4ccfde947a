import type { KeyboardEvent } from 'react';
import { controlClass } from '@/components/form/field';
import type { PrinterChoice } from '../station-view';

type PrinterOrderProps = {
  readonly printers: readonly PrinterChoice[];
  readonly chosen: readonly string[];
  readonly change: (chosen: string[]) => void;
  readonly error?: string | undefined;
};

const small = 'min-h-8 rounded px-1.5 text-[12.5px] font-semibold underline underline-offset-3 disabled:no-underline disabled:opacity-40 pointer-coarse:min-h-11';

/** The printers of a station in the order they are tried: the first that is up and in reach prints. */
export function PrinterOrder({ printers, chosen, change, error }: PrinterOrderProps) {
  const nameOf = (id: string): string => printers.find((printer) => printer.id === id)?.name ?? 'A printer that is gone';
  const left = printers.filter((printer) => !chosen.includes(printer.id));
  const move = (index: number, to: number): void => {
    const moved = chosen[index];
    if (moved !== undefined && to >= 0 && to < chosen.length) change(chosen.filter((id) => id !== moved).toSpliced(to, 0, moved));
  };
  const onKeyDown = (index: number) => (event: KeyboardEvent): void => {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    move(index, index + (event.key === 'ArrowUp' ? -1 : 1));
  };
  return (
    <fieldset className="grid gap-1.5">
      <legend className="mb-1 text-[12.5px] font-semibold text-soft">Printers, in the order they are tried</legend>
      {chosen.length === 0 ? null : (
        <ol className="grid gap-1">
          {chosen.map((id, index) => (
            <li key={id} onKeyDown={onKeyDown(index)} className="flex flex-wrap items-center gap-x-1 rounded-md border border-line bg-raised py-1 pr-1.5 pl-2.5">
              <span className="min-w-0 flex-1"><span className="mr-2 text-quiet">{index + 1}</span><b className="font-mono">{nameOf(id)}</b> <span className="ml-1 font-mono text-[12.5px] text-quiet">{printers.find((printer) => printer.id === id)?.where}</span></span>
              <button type="button" className={small} disabled={index === 0} onClick={() => move(index, index - 1)} aria-label={`Try ${nameOf(id)} earlier`}>Earlier</button>
              <button type="button" className={small} disabled={index === chosen.length - 1} onClick={() => move(index, index + 1)} aria-label={`Try ${nameOf(id)} later`}>Later</button>
              <button type="button" className={small} onClick={() => change(chosen.filter((one) => one !== id))} aria-label={`Take out ${nameOf(id)}`}>Take out</button>
            </li>
          ))}
        </ol>
      )}
      {left.length === 0 ? null : (
        <select value="" aria-label="Add a printer" onChange={(event) => change([...chosen, event.target.value])} className={controlClass}>
          <option value="">{chosen.length === 0 ? 'Choose a printer' : 'Add one for when these are out'}</option>
          {left.map((printer) => <option key={printer.id} value={printer.id}>{printer.name}, {printer.where}</option>)}
        </select>
      )}
      {printers.length === 0 ? <p className="text-[12.5px] text-quiet">No printers are written down for this site yet. The owner or the installer does that.</p> : null}
      {error === undefined ? null : <p className="text-[12.5px] font-semibold text-hot-text">{error}</p>}
    </fieldset>
  );
}
