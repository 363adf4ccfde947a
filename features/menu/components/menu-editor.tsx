'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { ConflictNotice } from '@/components/form/conflict-notice';
import { blankItem, type MenuView } from '../menu-view';
import { pasteBlock, type PasteColumn } from '../paste-rows';
import { ItemRow } from './item-row';
import styles from './menu.module.css';
import { useItems, type Items } from './use-items';

const headings = ['', 'Item', 'Kitchen name', 'Course', 'Allergens', 'Options', 'Seconds', 'Left', 'Sold out', 'No ticket', ''];

function AddLine({ section, items }: { readonly section: string; readonly items: Items }) {
  const [name, setName] = useState('');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (name.trim() === '') return;
    void items.add([{ ...blankItem(section, undefined), course: items.lines.at(-1)?.input.course ?? null, name: name.trim() }]);
    setName('');
  };
  return (
    <form onSubmit={submit} className="mt-3 flex flex-wrap gap-2">
      <label htmlFor="new-item" className="sr-only">A new item</label>
      <input id="new-item" value={name} onChange={(event) => setName(event.target.value)} maxLength={120} placeholder="A new item, then Enter" className="min-h-9 w-64 rounded-md border border-line-strong bg-raised px-2.5 text-[14px]" />
      <Button type="submit">Add</Button>
      <p className="self-center text-[12.5px] text-quiet">Enter and the arrows move between lines. Rows copied from a spreadsheet can be pasted into any cell.</p>
    </form>
  );
}

/** The items of a section as a table that is edited in place and saves by itself. */
export function MenuEditor({ view }: { readonly view: MenuView }) {
  const items = useItems(view.siteId, view.items);
  const { lines, notice, conflict } = items;
  const section = view.section;
  const paste = (row: number, column: PasteColumn, block: readonly (readonly string[])[]): void => {
    const like = lines[row]?.input;
    const result = pasteBlock(lines.map((line) => line.input), { row, column }, block, { ...blankItem(like?.section ?? section?.id ?? '', undefined), course: like?.course ?? null }, view.courses);
    for (const { index, input } of result.updates) {
      const line = lines[index];
      if (line !== undefined) items.change(line.id, input, `${result.updates.length + result.creates.length} lines pasted.`);
    }
    if (result.creates.length > 0 && section !== null) void items.add(result.creates);
  };
  return (
    <>
      {conflict === null ? null : <ConflictNotice words={conflict.words} differences={[]} keepMine={() => items.settle(true)} takeTheirs={() => items.settle(false)} />}
      <div className={styles['scroll']}>
        <table className={`${styles['table']} ${styles['grid']}`}>
          <thead><tr>{headings.map((heading, index) => <th key={index} scope="col">{heading === '' ? <span className="sr-only">{index === 0 ? 'Move' : 'Delete'}</span> : heading}</th>)}</tr></thead>
          <tbody>
            {lines.map((line, index) => <ItemRow key={line.id} line={line} index={index} last={lines.length - 1} view={view} change={items.change} drop={(id) => void items.drop(id)} move={items.move} paste={paste} />)}
          </tbody>
        </table>
      </div>
      {section === null ? null : <AddLine section={section.id} items={items} />}
      <div role="status" className="sticky bottom-4 mt-3 flex w-fit items-center gap-3 rounded-lg bg-night px-4 py-2.5 text-on-night shadow-lg empty:hidden">
        {notice === null ? null : <><span>{notice.words}</span>{notice.action === undefined ? null : <button type="button" onClick={notice.action.press} className="min-h-8 font-semibold underline underline-offset-3">{notice.action.label}</button>}</>}
      </div>
    </>
  );
}
