'use client';

import { useRef, useState } from 'react';
import type { Item } from '@/lib/domain/site/menu';
import { ProblemError } from '@/lib/http/client';
import { addItems, dropItem, placeItems, saveItem } from '../api/menu';
import { inputOf } from '../menu-view';
import type { ItemInput } from '../schema';

/** One line of the table: what it shows, and the version that was saved last. */
export type Line = { readonly id: string; readonly version: number; readonly input: ItemInput };

export type Notice = { readonly words: string; readonly tone: 'calm' | 'hot'; readonly action?: { readonly label: string; readonly press: () => void } };

/** Somebody else saved the line first: theirs, and what this person typed, which is kept until they choose. */
export type Conflict = { readonly line: Line; readonly words: string };

const wordsOf = (error: unknown): string => (error instanceof Error ? error.message : 'That did not work. Nothing you typed is lost. Try again.');

/** The lines of one section: every change is shown at once, saved at once, and can be taken back. */
export const useItems = (siteId: string, items: readonly Item[]) => {
  const [lines, setLines] = useState<readonly Line[]>(() => items.map((item) => ({ id: item.id, version: item.version, input: inputOf(item) })));
  const [notice, setNotice] = useState<Notice | null>(null);
  const [conflict, setConflict] = useState<Conflict | null>(null);
  const latest = useRef(lines);
  /** Saves of one line go out one after the other, each with the version the one before got. */
  const queues = useRef(new Map<string, Promise<void>>());

  const put = (change: (before: readonly Line[]) => readonly Line[]): void => {
    latest.current = change(latest.current);
    setLines(latest.current);
  };
  const lineOf = (id: string): Line | undefined => latest.current.find((line) => line.id === id);
  const show = (id: string, input: ItemInput): void => put((before) => before.map((line) => (line.id === id ? { ...line, input } : line)));

  const send = (id: string, input: ItemInput, version?: number): void => {
    const before = queues.current.get(id) ?? Promise.resolve();
    queues.current.set(id, before.then(async () => {
      const line = lineOf(id);
      if (line === undefined) return;
      try {
        const saved = await saveItem(siteId, id, version ?? line.version, input);
        put((all) => all.map((one) => (one.id === id ? { ...one, version: saved.version } : one)));
      } catch (error) {
        const current = error instanceof ProblemError && error.problem.code === 'stale' ? (error.problem.current as { version?: number } | undefined) : undefined;
        if (current?.version !== undefined) setConflict({ line: { id, version: current.version, input }, words: wordsOf(error) });
        else setNotice({ words: wordsOf(error), tone: 'hot', action: { label: 'Save again', press: () => send(id, input) } });
      }
    }));
  };

  const change = (id: string, input: ItemInput, words = `${input.name} saved.`): void => {
    const before = lineOf(id);
    if (before === undefined || JSON.stringify(before.input) === JSON.stringify(input)) return;
    show(id, input);
    send(id, input);
    setNotice({ words, tone: 'calm', action: { label: 'Undo', press: () => { show(id, before.input); send(id, before.input); setNotice({ words: `${before.input.name} is as it was.`, tone: 'calm' }); } } });
  };

  const add = async (inputs: readonly ItemInput[]): Promise<void> => {
    try {
      const { items: saved } = await addItems(siteId, inputs);
      put((all) => [...all, ...inputs.flatMap((input, index) => (saved[index] === undefined ? [] : [{ ...saved[index], input }]))]);
      setNotice({ words: inputs.length === 1 ? `${inputs[0]?.name ?? ''} added.` : `${inputs.length} items added.`, tone: 'calm' });
    } catch (error) {
      setNotice({ words: wordsOf(error), tone: 'hot' });
    }
  };

  const drop = async (id: string): Promise<void> => {
    const line = lineOf(id);
    if (line === undefined) return;
    try {
      await (queues.current.get(id) ?? Promise.resolve());
      await dropItem(siteId, id, lineOf(id)?.version ?? line.version);
      put((all) => all.filter((one) => one.id !== id));
      setNotice({ words: `${line.input.name} is off the menu.`, tone: 'calm', action: { label: 'Undo', press: () => void add([line.input]) } });
    } catch (error) {
      setNotice({ words: wordsOf(error), tone: 'hot' });
    }
  };

  const move = (from: number, to: number): void => {
    const moved = latest.current[from];
    if (moved === undefined || to < 0 || to >= latest.current.length || from === to) return;
    const before = latest.current;
    put((all) => all.filter((line) => line !== moved).toSpliced(to, 0, moved));
    placeItems(siteId, latest.current.map((line) => line.id)).then(
      () => setNotice({ words: `${moved.input.name} is number ${to + 1} now.`, tone: 'calm' }),
      (error: unknown) => { put(() => before); setNotice({ words: wordsOf(error), tone: 'hot' }); },
    );
  };

  const settle = (mine: boolean): void => {
    if (conflict === null) return;
    const { line } = conflict;
    setConflict(null);
    if (mine) send(line.id, line.input, line.version);
    else location.reload();
  };

  return { lines, notice, conflict, change, add, drop, move, settle };
};

export type Items = ReturnType<typeof useItems>;
