'use client';

import dynamic from 'next/dynamic';

/** The form and the checks that run beside it arrive when a panel is opened, not with the page. */
export const PrinterPanelLoader = dynamic(() => import('./printer-panel').then(({ PrinterPanel }) => PrinterPanel), { ssr: false });
