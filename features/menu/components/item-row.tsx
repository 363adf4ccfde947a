'use client';

import { useState, type ClipboardEvent, type DragEvent, type KeyboardEvent } from 'react';
import { allergens } from '@/lib/domain/site/menu';
import type { MenuView } from '../menu-view';
import { readBlock, type PasteColumn } from '../paste-rows';
import type { ItemInput } from '../schema';
import styles from './menu.module.css';
import { TickList } from './tick-list';
import type { Line } from './use-items';

export type RowProps = {
  readonly line: Line;
  readonly index: number;
  /** Index of the last line. */
  readonly last: number;
  readonly view: Pick<MenuView, 'courses' | 'groups'>;
  readonly change: (id: string, input: ItemInput, words?: string) => void;
  readonly drop: (id: string) => void;
  readonly move: (from: number, to: number) => void;
  readonly paste: (row: number, column: PasteColumn, block: readonly (readonly string[])[]) => void;
};

type CellProps = {
  readonly label: string;
  readonly value: string;
  readonly column: PasteColumn;
  readonly className?: string | undefined;
  readonly save: (text: string) => void;
  readonly onPaste: (block: readonly (readonly string[])[]) => void;
};

/** Moves to the same column of the next or previous line. */
const moveFocus = (cell: HTMLElement, step: 1 | -1): void => {
  const row = cell.closest('tr');
  const next = step === 1 ? row?.nextElementSibling : row?.previousElementSibling;
  const column = cell.dataset['column'];
  next?.querySelector<HTMLElement>(`[data-column="${column ?? ''}"]`)?.focus();
};

/** A cell that is a text box: Enter saves and goes down, Escape brings back what was there, a pasted block fills lines. */
function TextCell({ label, value, column, className, save, onPaste }: CellProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const commit = (): void => {
    if (typed !== null && typed !== value) save(typed);
    setTyped(null);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>): void => {
    if (event.altKey) return;
    if (event.key === 'Escape') setTyped(null);
    else if (event.key === 'Enter' || event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      commit();
      moveFocus(event.currentTarget, event.key === 'ArrowUp' || (event.key === 'Enter' && event.shiftKey) ? -1 : 1);
    }
  };
  const take = (event: ClipboardEvent<HTMLInputElement>): void => {
    const block = readBlock(event.clipboardData.getData('text'));
    if (block === null) return;
    event.preventDefault();
    onPaste(block);
  };
  return <input type="text" aria-label={label} data-column={column} className={className} value={typed ?? value} onChange={(event) => setTyped(event.target.value)} onBlur={commit} onKeyDown={onKeyDown} onPaste={take} />;
}

const number = (text: string): number | null | undefined => (text.trim() === '' ? null : /^\d{1,6}$/.test(text.trim()) ? Number(text) : undefined);

/** One item as a line of cells. Alt with the arrows moves the line; the handle drags it. */
export function ItemRow({ line, index, last, view, change, drop, move, paste }: RowProps) {
  const { id, input } = line;
  const { name } = input;
  const set = (part: Partial<ItemInput>, words?: string): void => change(id, { ...input, ...part }, words);
  const setNumber = (key: 'preparationSeconds' | 'left', text: string): void => {
    const value = number(text);
    if (value !== undefined) set({ [key]: value });
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    move(index, index + (event.key === 'ArrowUp' ? -1 : 1));
  };
  const onDrop = (event: DragEvent): void => {
    event.preventDefault();
    const from = Number(event.dataTransfer.getData('application/x-tamis-line'));
    if (Number.isInteger(from)) move(from, index);
  };
  const pasteAt = (column: PasteColumn) => (block: readonly (readonly string[])[]): void => paste(index, column, block);
  return (
    <tr onKeyDown={onKeyDown} onDragOver={(event) => event.preventDefault()} onDrop={onDrop} className={input.soldOut ? styles['soldOut'] : undefined}>
      <td><button type="button" draggable aria-label={`Move ${name}: Alt and the arrow keys`} title="Drag, or Alt and the arrow keys" className={styles['handle']} onDragStart={(event) => event.dataTransfer.setData('application/x-tamis-line', String(index))}>⋮⋮</button></td>
      <th scope="row"><TextCell label={`Name of ${name}`} column="name" value={name} onPaste={pasteAt('name')} save={(text) => { if (text.trim() !== '') set({ name: text.trim() }); }} /></th>
      <td><TextCell label={`Kitchen name of ${name}`} column="kitchenName" className={styles['kitchen']} value={input.kitchenName} onPaste={pasteAt('kitchenName')} save={(text) => set({ kitchenName: text.trim() })} /></td>
      <td>
        <select aria-label={`Course of ${name}`} value={input.course ?? ''} onChange={(event) => set({ course: event.target.value === '' ? null : event.target.value })}>
          <option value="">None</option>
          {view.courses.map((course) => <option key={course.id} value={course.id}>{course.name}</option>)}
        </select>
      </td>
      <td><TickList label={`Allergens of ${name}`} none="None" choices={allergens.map((allergen) => ({ value: allergen, words: allergen }))} chosen={input.allergens} change={(chosen) => set({ allergens: allergens.filter((one) => chosen.includes(one)) })} /></td>
      <td><TickList label={`Options of ${name}`} none="None" choices={view.groups.map((group) => ({ value: group.id, words: group.name }))} chosen={input.optionGroups} change={(chosen) => set({ optionGroups: [...chosen] })} /></td>
      <td><TextCell label={`Preparation seconds of ${name}`} column="preparationSeconds" className={styles['number']} value={input.preparationSeconds === null ? '' : String(input.preparationSeconds)} onPaste={pasteAt('preparationSeconds')} save={(text) => setNumber('preparationSeconds', text)} /></td>
      <td><TextCell label={`How many of ${name} are left`} column="left" className={styles['number']} value={input.left === null ? '' : String(input.left)} onPaste={pasteAt('left')} save={(text) => setNumber('left', text)} /></td>
      <td className="text-center"><input type="checkbox" aria-label={`${name} is sold out`} checked={input.soldOut} onChange={(event) => set({ soldOut: event.target.checked }, event.target.checked ? `${name} is sold out.` : `${name} is back.`)} /></td>
      <td className="text-center"><input type="checkbox" aria-label={`${name} needs no ticket`} checked={input.noTicket} onChange={(event) => set({ noTicket: event.target.checked })} /></td>
      <td className="whitespace-nowrap">
        <button type="button" className={styles['nudge']} disabled={index === 0} onClick={() => move(index, index - 1)} aria-label={`Move ${name} up`}>↑</button>
        <button type="button" className={styles['nudge']} disabled={index === last} onClick={() => move(index, index + 1)} aria-label={`Move ${name} down`}>↓</button>
        <button type="button" onClick={() => drop(id)} aria-label={`Take ${name} off the menu`} className="min-h-8 rounded px-2 text-[12.5px] font-semibold underline underline-offset-3">Delete</button>
      </td>
    </tr>
  );
}
