'use client';

import { useOpened } from './opened';

/** Opens what can be done with the plans themselves: a new one, a name, an order, weekly times. */
export function PlansButton() {
  const { open } = useOpened();
  return <button type="button" className="min-h-8 text-[13px] font-semibold underline underline-offset-3" onClick={() => open({ kind: 'plans' })}>Plans</button>;
}
