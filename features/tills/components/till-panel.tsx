'use client';

import { FactList } from '@/components/fact-list';
import { RecordPanelFrame } from '@/components/form/record-panel-frame';
import { SaveForm } from '@/components/form/save-form';
import { TakeOffList } from '@/components/form/take-off-list';
import { useRecordPanel, type RecordPanel } from '@/components/form/use-record-panel';
import { tillFacts } from '@/lib/domain/devices/till-differences';
import { takeTillOff } from '../api/tills';
import type { PanelView } from '../panel-view';
import { TillFormFields } from './till-form';
import { namingOf, useTillForm } from './use-till-form';

function EditTill({ view, panel }: { readonly view: PanelView; readonly panel: RecordPanel }) {
  const of = useTillForm(view, { saved: panel.saved, readAgain: panel.refresh });
  return <SaveForm of={of} close={panel.close} typed={panel.typed}><TillFormFields of={of} view={view} /></SaveForm>;
}

/** One till in the panel at the side: its fields, what is installed on it, and taking it off the list. */
export function TillPanel({ view }: { readonly view: PanelView }) {
  const panel = useRecordPanel();
  const { till } = view;
  return (
    <RecordPanelFrame title={till === null ? 'Add a till' : till.name} panel={panel}>
      {view.mayWrite ? <EditTill view={view} panel={panel} /> : till === null ? null : <FactList facts={tillFacts(till, namingOf(view))} />}
      {till === null || !view.mayWrite ? null : (
        <TakeOffList name={till.name} busy={panel.busy} takeOff={() => void panel.takeOff(() => takeTillOff(view.siteId, till.id, till.version))} {...view.dependents} />
      )}
    </RecordPanelFrame>
  );
}
