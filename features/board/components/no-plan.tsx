'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/button';
import { ProblemError } from '@/lib/http/client';
import { createPlan } from '../api/change-plans';

/** A site without a plan: what to do first, and the offer to do it. */
export function NoPlan({ siteId, mayWrite }: { readonly siteId: string; readonly mayWrite: boolean }) {
  const router = useRouter();
  const [trouble, setTrouble] = useState('');
  const begin = async (): Promise<void> => {
    try {
      await createPlan(siteId, 'Dinner', null);
      router.refresh();
    } catch (error) {
      setTrouble(error instanceof ProblemError ? error.message : 'The plan was not made. Reload the page, then try again.');
    }
  };
  return (
    <div className="max-w-[560px] px-4 py-10 md:px-[22px]">
      <h1 className="text-[27px] leading-[1.06] font-[680] font-stretch-[104%]">No plan yet</h1>
      <p className="mt-3 text-[15px]">A plan says what prints where for one service, such as Dinner. Until there is one, nothing prints.</p>
      {mayWrite
        ? <p className="mt-5"><Button kind="primary" onClick={() => void begin()}>Make a plan for Dinner</Button></p>
        : <p className="mt-5">The owner or a chef of this site can make one.</p>}
      <p role="alert" className="mt-3 font-semibold text-hot-text empty:hidden">{trouble}</p>
    </div>
  );
}
