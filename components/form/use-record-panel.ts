'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useState } from 'react';
import { ProblemError } from '@/lib/http/client';

/** How a panel at the side is left and what it is asked before: typed words are not dropped unasked, and a refusal stays in words. */
export const useRecordPanel = () => {
  const router = useRouter();
  const pathname = usePathname();
  const [guarded, setGuarded] = useState(false);
  const [dirty, setDirty] = useState(false);
  const [refused, setRefused] = useState('');
  const [busy, setBusy] = useState(false);
  const leave = (): void => router.push(pathname, { scroll: false });
  const refresh = (): void => router.refresh();

  return {
    guarded, refused, busy, leave, refresh,
    stay: () => setGuarded(false),
    typed: setDirty,
    close: (): void => (dirty ? setGuarded(true) : leave()),
    saved: () => {
      leave();
      refresh();
    },
    /** Runs a deletion and leaves when it was done. */
    takeOff: async (drop: () => Promise<unknown>): Promise<void> => {
      setBusy(true);
      try {
        await drop();
        leave();
      } catch (error) {
        if (!(error instanceof ProblemError)) throw error;
        setRefused(error.problem.detail);
      } finally {
        setBusy(false);
        refresh();
      }
    },
  };
};

export type RecordPanel = ReturnType<typeof useRecordPanel>;
