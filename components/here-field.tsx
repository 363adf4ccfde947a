'use client';

import { usePathname, useSearchParams } from 'next/navigation';

/** Tells a plain form which page it was sent from, so that its answer can come back to it. */
export function HereField({ name }: { readonly name: string }) {
  const query = useSearchParams().toString();
  const path = usePathname();
  return <input type="hidden" name={name} value={query === '' ? path : `${path}?${query}`} />;
}
