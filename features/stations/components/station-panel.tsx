'use client';

import { FactList } from '@/components/fact-list';
import { RecordPanelFrame } from '@/components/form/record-panel-frame';
import { SaveForm } from '@/components/form/save-form';
import { TakeOffList } from '@/components/form/take-off-list';
import { useRecordPanel, type RecordPanel } from '@/components/form/use-record-panel';
import { stationFacts } from '@/lib/domain/stations/station-differences';
import { dropStation } from '../api/stations';
import type { StationView } from '../station-view';
import { StationFormFields } from './station-form';
import { useStationForm } from './use-station-form';

function EditStation({ view, panel }: { readonly view: StationView; readonly panel: RecordPanel }) {
  const of = useStationForm(view, { saved: panel.saved, readAgain: panel.refresh });
  return <SaveForm of={of} close={panel.close} typed={panel.typed}><StationFormFields of={of} view={view} /></SaveForm>;
}

/** One station in the panel at the side: its fields, and taking it off the list. */
export function StationPanel({ view }: { readonly view: StationView }) {
  const panel = useRecordPanel();
  const { station } = view;
  return (
    <RecordPanelFrame title={station === null ? 'Add a station' : station.name} panel={panel}>
      {view.mayWrite ? <EditStation view={view} panel={panel} /> : station === null ? null : <FactList facts={stationFacts(station, view)} />}
      {station === null || !view.mayWrite ? null : (
        <TakeOffList name={station.name} busy={panel.busy} takeOff={() => void panel.takeOff(() => dropStation(view.siteId, station.id, station.version))} {...view.dependents} />
      )}
    </RecordPanelFrame>
  );
}
