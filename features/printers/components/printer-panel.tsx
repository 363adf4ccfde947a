'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';
import { Button } from '@/components/button';
import { FactList } from '@/components/fact-list';
import { ConflictNotice } from '@/components/form/conflict-notice';
import { LeaveGuard } from '@/components/form/leave-guard';
import { TakeOffList } from '@/components/form/take-off-list';
import { SidePanel } from '@/components/side-panel';
import { printerFacts } from '@/lib/domain/devices/printer-differences';
import { ProblemError } from '@/lib/http/client';
import { takePrinterOff } from '../api/printers';
import type { PanelView } from '../panel-view';
import { BackupChoice } from './backup-choice';
import { PrinterDown } from './printer-down';
import { PrinterFormFields } from './printer-form';
import { PrinterTests } from './printer-tests';
import { usePrinterForm } from './use-printer-form';

const namingOf = (view: PanelView) => ({ tills: view.site.tills, printers: view.site.printers, sharedPoints: view.sharedPoints });

type EditProps = { readonly view: PanelView; readonly close: () => void; readonly leave: () => void; readonly typed: (dirty: boolean) => void };

function EditPrinter({ view, close, leave, typed }: EditProps) {
  const router = useRouter();
  const of = usePrinterForm(view, { saved: () => { leave(); router.refresh(); }, readAgain: () => router.refresh() });
  const { formState } = of.form;
  const { isDirty } = formState;
  useEffect(() => typed(isDirty), [typed, isDirty]);
  return (
    <form noValidate onSubmit={(event) => void of.save(event)} className="grid gap-4">
      <PrinterFormFields of={of} view={view} />
      {of.refused?.stale === true && of.theirs !== null ? (
        <ConflictNotice words={of.refused.words} differences={of.theirs} keepMine={of.keepMine} takeTheirs={of.takeTheirs} />
      ) : of.refused === null ? null : <p role="alert" className="text-[13.5px] font-semibold text-hot-text">{of.refused.words}</p>}
      {of.testsFall ? <p className="text-[13px] text-look-text">Once this is saved, its printed tests no longer count: print one from each till again.</p> : null}
      <div className="sticky bottom-0 flex gap-2 border-t border-line bg-panel py-3">
        <Button type="submit" kind="primary" disabled={formState.isSubmitting}>{of.base === null ? 'Add it' : 'Save'}</Button>
        <Button onClick={close}>Cancel</Button>
      </div>
    </form>
  );
}

/** One printer in the panel at the side: its fields, its tests, whether it is down, and taking it off the list. */
export function PrinterPanel({ view }: { readonly view: PanelView }) {
  const router = useRouter();
  const pathname = usePathname();
  const [guarded, setGuarded] = useState(false);
  const [dirty, setDirty] = useState(false);
  const [refused, setRefused] = useState('');
  const [busy, setBusy] = useState(false);
  const { printer } = view;
  const leave = (): void => router.push(pathname, { scroll: false });
  const close = (): void => (dirty ? setGuarded(true) : leave());
  const refresh = (): void => router.refresh();

  const takeOff = async (): Promise<void> => {
    if (printer === null) return;
    setBusy(true);
    try {
      await takePrinterOff(view.siteId, printer.id, printer.version);
      leave();
      refresh();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
      refresh();
    } finally {
      setBusy(false);
    }
  };

  return (
    <SidePanel title={printer === null ? 'Add a printer' : printer.name} close={close}>
      <div className="grid gap-4">
        {guarded ? <LeaveGuard stay={() => setGuarded(false)} leave={leave} /> : null}
        {view.mayWrite ? <EditPrinter view={view} close={close} leave={leave} typed={setDirty} /> : printer === null ? null : <FactList facts={printerFacts(printer, namingOf(view))} />}
        {printer === null ? null : (
          <>
            <PrinterTests view={view} printer={printer.id} changed={refresh} />
            {view.maySetBackup && !view.mayWrite ? <BackupChoice siteId={view.siteId} printer={printer} others={view.site.printers.filter((one) => one.id !== printer.id)} changed={refresh} /> : null}
            {view.mayMarkDown ? (
              <PrinterDown siteId={view.siteId} timeZone={view.timeZone} printer={printer} changed={refresh} backup={view.site.printers.find((one) => one.id === printer.backup)?.name ?? null} />
            ) : null}
            {view.mayWrite ? <TakeOffList name={printer.name} busy={busy} takeOff={() => void takeOff()} {...view.dependents} /> : null}
            <p role="status" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
          </>
        )}
      </div>
    </SidePanel>
  );
}
