'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useState, useTransition, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { TakeOffList } from '@/components/form/take-off-list';
import { TextField } from '@/components/form/text-field';
import { SidePanel } from '@/components/side-panel';
import { ProblemError } from '@/lib/http/client';
import { addArea, renameArea, takeAreaOff } from '../api/areas';
import type { AreasView } from '../panel-view';

/** Runs one change, reads the page again, and keeps the refusal for the screen. */
const useChange = () => {
  const router = useRouter();
  const [refused, setRefused] = useState('');
  const [busy, startTransition] = useTransition();
  const run = (change: () => Promise<unknown>, done: () => void = () => undefined): void => startTransition(async () => {
    try {
      await change();
      setRefused('');
      done();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
    }
    router.refresh();
  });
  return { run, busy, refused };
};

function OneArea({ siteId, area }: { readonly siteId: string; readonly area: AreasView['areas'][number] }) {
  const { run, busy, refused } = useChange();
  const [name, setName] = useState(area.name);
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    run(() => renameArea(siteId, area.id, area.version, name));
  };
  return (
    <li className="grid gap-2 rounded-md border border-line bg-raised p-3">
      <form onSubmit={submit} className="flex flex-wrap items-end gap-2">
        <div className="min-w-40 flex-1"><TextField id={`area-${area.id}`} label={`Name of ${area.name}`} hint={`${area.tills} ${area.tills === 1 ? 'till stands' : 'tills stand'} in it.`} value={name} onChange={(event) => setName(event.target.value)} /></div>
        <Button type="submit" disabled={busy || name.trim() === '' || name.trim() === area.name}>Rename</Button>
      </form>
      <TakeOffList name={area.name} busy={busy} takeOff={() => run(() => takeAreaOff(siteId, area.id, area.version))} {...area.dependents} />
      <p role="alert" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
    </li>
  );
}

/** The parts of the room that orders come from. */
export function AreasPanel({ view }: { readonly view: AreasView }) {
  const router = useRouter();
  const pathname = usePathname();
  const { run, busy, refused } = useChange();
  const [name, setName] = useState('');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    run(() => addArea(view.siteId, name), () => setName(''));
  };
  return (
    <SidePanel title="Areas" close={() => router.push(pathname, { scroll: false })}>
      <div className="grid gap-4">
        <p className="text-[13px] text-soft">A rule can hold for one area alone, so that the terrace prints at the terrace bar. Each till stands in one.</p>
        <ul className="grid gap-2">{view.areas.map((area) => <OneArea key={`${area.id} ${area.version}`} siteId={view.siteId} area={area} />)}</ul>
        <form onSubmit={submit} className="flex flex-wrap items-end gap-2 border-t border-line pt-4">
          <div className="min-w-40 flex-1"><TextField id="area-new" label="Add an area" placeholder="Terrace" value={name} onChange={(event) => setName(event.target.value)} error={refused === '' ? undefined : refused} /></div>
          <Button type="submit" kind="primary" disabled={busy || name.trim() === ''}>Add it</Button>
        </form>
      </div>
    </SidePanel>
  );
}
