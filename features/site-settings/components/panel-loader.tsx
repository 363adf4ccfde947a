'use client';

import dynamic from 'next/dynamic';
import type { PartView } from '../view';

const Panel = dynamic(() => import('./settings-panel').then(({ SettingsPanel }) => SettingsPanel), { ssr: false });

/** Forms and the checks that run beside them arrive when a part is opened, not with the page. */
export function SettingsPanelLoader({ view }: { readonly view: PartView }) {
  return <Panel view={view} />;
}
