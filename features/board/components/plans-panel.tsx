'use client';

import { SidePanel } from '@/components/side-panel';

export function PlansPanel({ close }: { readonly close: () => void }) {
  return <SidePanel title="Plans" close={close}>{null}</SidePanel>;
}
