'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import { Button } from '@/components/button';
import type { MenuView } from '../menu-view';

const ImportPanel = dynamic(() => import('./import-panel').then((loaded) => loaded.ImportPanel), { ssr: false });
const GroupsPanel = dynamic(() => import('./groups-panel').then((loaded) => loaded.GroupsPanel), { ssr: false });
const SectionsPanel = dynamic(() => import('./sections-panel').then((loaded) => loaded.SectionsPanel), { ssr: false });

type ToolProps = { readonly view: MenuView };

export function MenuTools({ view }: ToolProps) {
  const [open, setOpen] = useState<'import' | 'groups' | 'sections' | null>(null);
  const close = (): void => setOpen(null);
  return (
    <>
      <Button onClick={() => setOpen('groups')}>Options</Button>
      {view.sections.length === 0 ? <Button onClick={() => setOpen('sections')}>Write a menu section</Button> : null}
      <Button kind="primary" onClick={() => setOpen('import')}>Bring in a file</Button>
      {open === 'import' ? <ImportPanel siteId={view.siteId} close={close} /> : null}
      {open === 'groups' ? <GroupsPanel view={view} close={close} /> : null}
      {open === 'sections' ? <SectionsPanel view={view} close={close} /> : null}
    </>
  );
}

export function SectionsTool({ view }: ToolProps) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button className="mt-2.5 w-full" onClick={() => setOpen(true)}>Add, rename or reorder</Button>
      {open ? <SectionsPanel view={view} close={() => setOpen(false)} /> : null}
    </>
  );
}
