import type { ReactNode } from 'react';
import { SidePanel } from '@/components/side-panel';
import { LeaveGuard } from './leave-guard';
import type { RecordPanel } from './use-record-panel';

/** The panel around one record: asks before typed words are dropped, and keeps a refusal in sight. */
export function RecordPanelFrame({ title, panel, children }: { readonly title: string; readonly panel: RecordPanel; readonly children: ReactNode }) {
  return (
    <SidePanel title={title} close={panel.close}>
      <div className="grid gap-4">
        {panel.guarded ? <LeaveGuard stay={panel.stay} leave={panel.leave} /> : null}
        {children}
        <p role="status" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{panel.refused}</p>
      </div>
    </SidePanel>
  );
}
