'use client';

import { FactList } from '@/components/fact-list';
import { RecordPanelFrame } from '@/components/form/record-panel-frame';
import { SaveForm } from '@/components/form/save-form';
import { TakeOffList } from '@/components/form/take-off-list';
import { useRecordPanel, type RecordPanel } from '@/components/form/use-record-panel';
import { printerFacts } from '@/lib/domain/devices/printer-differences';
import { takePrinterOff } from '../api/printers';
import type { PanelView } from '../panel-view';
import { BackupChoice } from './backup-choice';
import { PrinterDown } from './printer-down';
import { PrinterFormFields } from './printer-form';
import { PrinterTests } from './printer-tests';
import { usePrinterForm } from './use-printer-form';

const namingOf = (view: PanelView) => ({ tills: view.site.tills, printers: view.site.printers, sharedPoints: view.sharedPoints });

function EditPrinter({ view, panel }: { readonly view: PanelView; readonly panel: RecordPanel }) {
  const of = usePrinterForm(view, { saved: panel.saved, readAgain: panel.refresh });
  return (
    <SaveForm of={of} close={panel.close} typed={panel.typed}>
      <PrinterFormFields of={of} view={view} />
      {of.testsFall ? <p className="text-[13px] text-look-text">Once this is saved, its printed tests no longer count: print one from each till again.</p> : null}
    </SaveForm>
  );
}

/** One printer in the panel at the side: its fields, its tests, whether it is down, and taking it off the list. */
export function PrinterPanel({ view }: { readonly view: PanelView }) {
  const panel = useRecordPanel();
  const { printer } = view;
  return (
    <RecordPanelFrame title={printer === null ? 'Add a printer' : printer.name} panel={panel}>
      {view.mayWrite ? <EditPrinter view={view} panel={panel} /> : printer === null ? null : <FactList facts={printerFacts(printer, namingOf(view))} />}
      {printer === null ? null : (
        <>
          <PrinterTests view={view} printer={printer.id} changed={panel.refresh} />
          {view.maySetBackup && !view.mayWrite ? <BackupChoice siteId={view.siteId} printer={printer} others={view.site.printers.filter((one) => one.id !== printer.id)} changed={panel.refresh} /> : null}
          {view.mayMarkDown ? (
            <PrinterDown siteId={view.siteId} timeZone={view.timeZone} printer={printer} changed={panel.refresh} backup={view.site.printers.find((one) => one.id === printer.backup)?.name ?? null} />
          ) : null}
          {view.mayWrite ? <TakeOffList name={printer.name} busy={panel.busy} takeOff={() => void panel.takeOff(() => takePrinterOff(view.siteId, printer.id, printer.version))} {...view.dependents} /> : null}
        </>
      )}
    </RecordPanelFrame>
  );
}
