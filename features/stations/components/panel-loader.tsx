'use client';

import dynamic from 'next/dynamic';

/** The form arrives when a panel is opened, not with the page. */
export const StationPanelLoader = dynamic(() => import('./station-panel').then(({ StationPanel }) => StationPanel), { ssr: false });
export const StationOrderLoader = dynamic(() => import('./station-order').then(({ StationOrder }) => StationOrder), { ssr: false });
