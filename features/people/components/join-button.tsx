'use client';

import { useState } from 'react';
import { Button } from '@/components/button';
import { ProblemError } from '@/lib/http/client';
import { homePath } from '@/lib/navigation';
import { join } from '../api/people';

/** Joining as who one is signed in as. */
export function JoinButton({ token, site }: { readonly token: string; readonly site: string }) {
  const [refused, setRefused] = useState('');
  const [waiting, setWaiting] = useState(false);
  const press = async (): Promise<void> => {
    if (waiting) return;
    setWaiting(true);
    try {
      const { siteId, role } = await join(token);
      location.assign(homePath(siteId, role));
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
      setWaiting(false);
    }
  };
  return (
    <>
      <p role="alert" className="rounded-lg border border-hot bg-hot-tint px-3 py-2 font-semibold text-hot-text empty:hidden">{refused}</p>
      <Button kind="primary" aria-disabled={waiting} onClick={() => void press()} className="min-h-12 text-[16px]">{waiting ? 'Joining' : `Join ${site}`}</Button>
    </>
  );
}
