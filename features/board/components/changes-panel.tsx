'use client';

import { SidePanel } from '@/components/side-panel';
import { useSettings } from './board-context';
import { useNotLive } from './use-not-live';

/** What the board says that the live version does not, line by line. */
export function ChangesPanel({ close }: { readonly close: () => void }) {
  const { planName } = useSettings();
  const changes = useNotLive();
  return (
    <SidePanel title="Not live yet" close={close}>
      <p className="text-[13px] text-soft">The tills still follow the {planName} that is live. These changes print nothing until it is put live again.</p>
      <ul className="mt-4 grid gap-px overflow-hidden rounded-md border border-line bg-line">
        {changes.map((change) => <li key={change.key} className="bg-raised px-3 py-2">{change.words}</li>)}
      </ul>
    </SidePanel>
  );
}
