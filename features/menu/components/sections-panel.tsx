'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { SidePanel } from '@/components/side-panel';
import { addSection, dropSection, placeSections, saveSection } from '../api/menu';
import type { MenuView } from '../menu-view';

const small = 'min-h-8 rounded px-2 text-[12.5px] font-semibold underline underline-offset-3 disabled:no-underline disabled:opacity-40';

/** Adds, renames, reorders and deletes menu sections. */
export function SectionsPanel({ view, close }: { readonly view: MenuView; readonly close: () => void }) {
  const router = useRouter();
  const [fault, setFault] = useState('');
  const [name, setName] = useState('');
  const act = async (work: () => Promise<unknown>): Promise<void> => {
    setFault('');
    try {
      await work();
      router.refresh();
    } catch (error) {
      setFault((error as Error).message);
    }
  };
  const move = (index: number, step: number): Promise<void> => {
    const ids = view.sections.map((section) => section.id as string);
    const [moved = ''] = ids.splice(index, 1);
    ids.splice(index + step, 0, moved);
    return act(() => placeSections(view.siteId, ids));
  };
  const add = (event: FormEvent): void => {
    event.preventDefault();
    void act(() => addSection(view.siteId, name)).then(() => setName(''));
  };
  return (
    <SidePanel title="Menu sections" close={close}>
      <form onSubmit={add} className="flex gap-2">
        <label htmlFor="new-section" className="sr-only">A new menu section</label>
        <input id="new-section" required maxLength={120} value={name} onChange={(event) => setName(event.target.value)} placeholder="A new menu section" className="min-h-10 flex-1 rounded-md border border-line-strong bg-raised px-2.5" />
        <Button type="submit" kind="primary">Add</Button>
      </form>
      <p role="alert" className="mt-3 rounded-lg bg-hot-tint px-3 py-2 text-hot-text empty:hidden">{fault}</p>
      <ol className="mt-3 grid gap-1.5">
        {view.sections.map((section, index) => (
          <li key={section.id} className="flex flex-wrap items-center gap-2 rounded-md border border-line bg-raised px-2.5 py-1.5">
            <input
              aria-label={`Name of ${section.name}`} defaultValue={section.name} key={`${section.name} ${section.version}`} maxLength={120} className="min-h-8 min-w-0 flex-1 rounded border border-transparent bg-transparent px-1.5 font-semibold hover:border-line-strong"
              onBlur={({ target }) => { if (target.value.trim() !== section.name && target.value.trim() !== '') void act(() => saveSection(view.siteId, section.id, section.version, target.value)); }}
              onKeyDown={(event) => {
                if (event.key === 'Enter') event.currentTarget.blur();
                if (event.altKey && event.key === 'ArrowUp' && index > 0) void move(index, -1);
                if (event.altKey && event.key === 'ArrowDown' && index < view.sections.length - 1) void move(index, 1);
              }}
            />
            <span className="text-[12.5px] text-quiet">{section.items} items</span>
            <button type="button" className={small} disabled={index === 0} onClick={() => void move(index, -1)} aria-label={`Move ${section.name} up`}>Up</button>
            <button type="button" className={small} disabled={index === view.sections.length - 1} onClick={() => void move(index, 1)} aria-label={`Move ${section.name} down`}>Down</button>
            <button type="button" className={small} onClick={() => void act(() => dropSection(view.siteId, section.id, section.version))} aria-label={`Delete ${section.name}`}>Delete</button>
          </li>
        ))}
      </ol>
    </SidePanel>
  );
}
