'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';
import { Button } from '@/components/button';
import { FactList } from '@/components/fact-list';
import { ConflictNotice } from '@/components/form/conflict-notice';
import { LeaveGuard } from '@/components/form/leave-guard';
import { TakeOffList } from '@/components/form/take-off-list';
import { SidePanel } from '@/components/side-panel';
import { stationFacts } from '@/lib/domain/stations/station-differences';
import { ProblemError } from '@/lib/http/client';
import { dropStation } from '../api/stations';
import type { StationView } from '../station-view';
import { StationFormFields } from './station-form';
import { useStationForm } from './use-station-form';

type EditProps = { readonly view: StationView; readonly close: () => void; readonly leave: () => void; readonly typed: (dirty: boolean) => void };

function EditStation({ view, close, leave, typed }: EditProps) {
  const router = useRouter();
  const of = useStationForm(view, { saved: () => { leave(); router.refresh(); }, readAgain: () => router.refresh() });
  const { isDirty, isSubmitting } = of.form.formState;
  useEffect(() => typed(isDirty), [typed, isDirty]);
  return (
    <form noValidate onSubmit={(event) => void of.save(event)} className="grid gap-4">
      <StationFormFields of={of} view={view} />
      {of.refused?.stale === true && of.theirs !== null ? (
        <ConflictNotice words={of.refused.words} differences={of.theirs} keepMine={of.keepMine} takeTheirs={of.takeTheirs} />
      ) : of.refused === null ? null : <p role="alert" className="text-[13.5px] font-semibold text-hot-text">{of.refused.words}</p>}
      <div className="sticky bottom-0 z-10 flex gap-2 border-t border-line bg-panel py-3">
        <Button type="submit" kind="primary" disabled={isSubmitting}>{of.base === null ? 'Add it' : 'Save'}</Button>
        <Button onClick={close}>Cancel</Button>
      </div>
    </form>
  );
}

/** One station in the panel at the side: its fields, and taking it off the list. */
export function StationPanel({ view }: { readonly view: StationView }) {
  const router = useRouter();
  const pathname = usePathname();
  const [guarded, setGuarded] = useState(false);
  const [dirty, setDirty] = useState(false);
  const [refused, setRefused] = useState('');
  const [busy, setBusy] = useState(false);
  const { station } = view;
  const leave = (): void => router.push(pathname, { scroll: false });
  const close = (): void => (dirty ? setGuarded(true) : leave());

  const takeOff = async (): Promise<void> => {
    if (station === null) return;
    setBusy(true);
    try {
      await dropStation(view.siteId, station.id, station.version);
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
    <SidePanel title={station === null ? 'Add a station' : station.name} close={close}>
      <div className="grid gap-4">
        {guarded ? <LeaveGuard stay={() => setGuarded(false)} leave={leave} /> : null}
        {view.mayWrite ? <EditStation view={view} close={close} leave={leave} typed={setDirty} /> : station === null ? null : <FactList facts={stationFacts(station, view)} />}
        {station === null || !view.mayWrite ? null : <TakeOffList name={station.name} busy={busy} takeOff={() => void takeOff()} {...view.dependents} />}
        <p role="status" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
      </div>
    </SidePanel>
  );
}
