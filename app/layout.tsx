import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { chosenLight } from '@/lib/server/chosen-light';
import './globals.css';

export const metadata: Metadata = {
  title: { template: '%s, Tamis', default: 'Tamis' },
  description: 'Decides what prints where in a restaurant, and proves that nothing is lost.',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1, themeColor: '#20251f' };

export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  const light = await chosenLight();
  return (
    <html lang="en" data-light={light}>
      <body>{children}</body>
    </html>
  );
}
