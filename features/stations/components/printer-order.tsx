import type { KeyboardEvent } from 'react';

type PrinterOrderProps = {
  readonly printers: readonly { readonly id: string; readonly name: string }[];
  readonly chosen: readonly string[];
  readonly disabled: boolean;
  readonly change: (chosen: readonly string[]) => void;
};

const small = 'min-h-8 rounded px-2 text-[12.5px] font-semibold underline underline-offset-3 disabled:opacity-40 disabled:no-underline';

/** The printers of a station in the order they are tried; the first that is up and in reach prints. */
export function PrinterOrder({ printers, chosen, disabled, change }: PrinterOrderProps) {
  const nameOf = (id: string): string => printers.find((printer) => printer.id === id)?.name ?? id;
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
    <fieldset disabled={disabled} className="grid gap-1.5">
      <legend className="mb-1 text-[12.5px] font-semibold text-soft">Printers, in the order they are tried</legend>
      {chosen.length === 0 ? <p className="text-[13px] font-semibold text-hot-text">None: everything sent here would be lost.</p> : null}
      <ol className="grid gap-1">
        {chosen.map((id, index) => (
          <li key={id} onKeyDown={onKeyDown(index)} className="flex items-center gap-1 rounded-md border border-line bg-raised px-2.5 py-1">
            <span className="flex-1 font-mono font-semibold">{index + 1}. {nameOf(id)}</span>
            <button type="button" className={small} disabled={index === 0} onClick={() => move(index, index - 1)} aria-label={`Try ${nameOf(id)} earlier`}>Earlier</button>
            <button type="button" className={small} disabled={index === chosen.length - 1} onClick={() => move(index, index + 1)} aria-label={`Try ${nameOf(id)} later`}>Later</button>
            <button type="button" className={small} onClick={() => change(chosen.filter((one) => one !== id))} aria-label={`Take out ${nameOf(id)}`}>Take out</button>
          </li>
        ))}
      </ol>
      {left.length === 0 ? null : (
        <label className="grid gap-1 text-[12.5px] font-semibold text-soft">Add a printer
          <select value="" onChange={(event) => change([...chosen, event.target.value])} className="min-h-10 rounded-md border border-line-strong bg-raised px-2.5 text-[14px] font-normal text-ink">
            <option value="">Choose one</option>
            {left.map((printer) => <option key={printer.id} value={printer.id}>{printer.name}</option>)}
          </select>
        </label>
      )}
    </fieldset>
  );
}
