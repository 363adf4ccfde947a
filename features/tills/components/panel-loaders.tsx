'use client';

import dynamic from 'next/dynamic';

/** Forms and the checks that run beside them arrive when a panel is opened, not with the page. */
export const TillPanelLoader = dynamic(() => import('./till-panel').then(({ TillPanel }) => TillPanel), { ssr: false });
export const AreasPanelLoader = dynamic(() => import('./areas-panel').then(({ AreasPanel }) => AreasPanel), { ssr: false });
