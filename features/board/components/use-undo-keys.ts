'use client';

import { useEffect } from 'react';
import { redo, undo } from '../store/make-edit';
import { useSettings, useStore } from './board-context';

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('input:not([type=checkbox]):not([type=radio]), textarea, select, [contenteditable]') !== null;

/** Ctrl+Z and Ctrl+Shift+Z (or Ctrl+Y), but never while somebody types in a field. */
export const useUndoKeys = (): void => {
  const store = useStore();
  const { mayWrite } = useSettings();
  useEffect(() => {
    if (!mayWrite) return undefined;
    const onKey = (event: KeyboardEvent): void => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || isTyping(event.target)) return;
      const key = event.key.toLowerCase();
      const again = (key === 'z' && event.shiftKey) || key === 'y';
      if (!again && key !== 'z') return;
      event.preventDefault();
      store.set((state) => (again ? redo(state, store.site) : undo(state, store.site)));
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [store, mayWrite]);
};
