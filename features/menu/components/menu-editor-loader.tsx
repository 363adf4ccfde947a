'use client';

import { useEffect, useState, type ComponentType, type ReactNode } from 'react';
import type { MenuView } from '../menu-view';

type EditorProps = { readonly view: MenuView };

/** The table is there at once as the server made it; the editing code takes its place when it has arrived. */
export function MenuEditorLoader({ view, children }: EditorProps & { readonly children: ReactNode }) {
  const [Editor, setEditor] = useState<ComponentType<EditorProps> | null>(null);
  useEffect(() => {
    let wanted = true;
    void import('./menu-editor').then(({ MenuEditor }) => {
      if (wanted) setEditor(() => MenuEditor);
    });
    return () => {
      wanted = false;
    };
  }, []);
  return Editor === null ? children : <Editor key={`${view.section?.id ?? ''} ${view.search}`} view={view} />;
}
