'use client';

import { useRouter } from 'next/navigation';
import { useState, useTransition } from 'react';
import { ProblemError } from '@/lib/http/client';
import { inviteAgain, takeInvitationBack } from '../api/people';

const press = 'min-h-9 text-[13px] font-semibold underline underline-offset-3 disabled:opacity-50 pointer-coarse:min-h-11';

/** Sends an open invitation once more, or takes it back. */
export function InvitationButtons({ siteId, invitation, email }: { readonly siteId: string; readonly invitation: string; readonly email: string }) {
  const router = useRouter();
  const [said, setSaid] = useState('');
  const [busy, startTransition] = useTransition();
  const run = (work: () => Promise<unknown>, done: string): void => startTransition(async () => {
    setSaid(await work().then(() => done, (error: unknown) => {
      if (error instanceof ProblemError) return error.problem.detail;
      throw error;
    }));
    router.refresh();
  });
  return (
    <>
      <span className="-my-2 flex flex-wrap gap-x-4">
        <button type="button" className={press} disabled={busy} aria-label={`Send the invitation of ${email} again`} onClick={() => run(() => inviteAgain(siteId, invitation), 'Sent again: only the new link works.')}>Send again</button>
        <button type="button" className={press} disabled={busy} aria-label={`Take the invitation of ${email} back`} onClick={() => run(() => takeInvitationBack(siteId, invitation), 'Taken back.')}>Take back</button>
      </span>
      <span role="status" className="block text-[12.5px] text-soft empty:hidden">{said}</span>
    </>
  );
}
