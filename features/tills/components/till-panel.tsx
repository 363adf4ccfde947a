'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';
import { Button } from '@/components/button';
import { FactList } from '@/components/fact-list';
import { ConflictNotice } from '@/components/form/conflict-notice';
import { LeaveGuard } from '@/components/form/leave-guard';
import { TakeOffList } from '@/components/form/take-off-list';
import { SidePanel } from '@/components/side-panel';
import { tillFacts } from '@/lib/domain/devices/till-differences';
import { ProblemError } from '@/lib/http/client';
import { takeTillOff } from '../api/tills';
import type { PanelView } from '../panel-view';
import { TillFormFields } from './till-form';
import { namingOf, useTillForm } from './use-till-form';

type EditProps = { readonly view: PanelView; readonly close: () => void; readonly leave: () => void; readonly typed: (dirty: boolean) => void };

function EditTill({ view, close, leave, typed }: EditProps) {
  const router = useRouter();
  const of = useTillForm(view, { saved: () => { leave(); router.refresh(); }, readAgain: () => router.refresh() });
  const { isDirty, isSubmitting } = of.form.formState;
  useEffect(() => typed(isDirty), [typed, isDirty]);
  return (
    <form noValidate onSubmit={(event) => void of.save(event)} className="grid gap-4">
      <TillFormFields of={of} view={view} />
      {of.refused?.stale === true && of.theirs !== null ? (
        <ConflictNotice words={of.refused.words} differences={of.theirs} keepMine={of.keepMine} takeTheirs={of.takeTheirs} />
      ) : of.refused === null ? null : <p role="alert" className="text-[13.5px] font-semibold text-hot-text">{of.refused.words}</p>}
      <div className="sticky bottom-0 flex gap-2 border-t border-line bg-panel py-3">
        <Button type="submit" kind="primary" disabled={isSubmitting}>{of.base === null ? 'Add it' : 'Save'}</Button>
        <Button onClick={close}>Cancel</Button>
      </div>
    </form>
  );
}

/** One till in the panel at the side: its fields, what is installed on it, and taking it off the list. */
export function TillPanel({ view }: { readonly view: PanelView }) {
  const router = useRouter();
  const pathname = usePathname();
  const [guarded, setGuarded] = useState(false);
  const [dirty, setDirty] = useState(false);
  const [refused, setRefused] = useState('');
  const [busy, setBusy] = useState(false);
  const { till } = view;
  const leave = (): void => router.push(pathname, { scroll: false });
  const close = (): void => (dirty ? setGuarded(true) : leave());

  const takeOff = async (): Promise<void> => {
    if (till === null) return;
    setBusy(true);
    try {
      await takeTillOff(view.siteId, till.id, till.version);
      leave();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
    } finally {
      setBusy(false);
      router.refresh();
    }
  };

  return (
    <SidePanel title={till === null ? 'Add a till' : till.name} close={close}>
      <div className="grid gap-4">
        {guarded ? <LeaveGuard stay={() => setGuarded(false)} leave={leave} /> : null}
        {view.mayWrite ? <EditTill view={view} close={close} leave={leave} typed={setDirty} /> : till === null ? null : <FactList facts={tillFacts(till, namingOf(view))} />}
        {till === null || !view.mayWrite ? null : <TakeOffList name={till.name} busy={busy} takeOff={() => void takeOff()} {...view.dependents} />}
        <p role="status" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
      </div>
    </SidePanel>
  );
}
