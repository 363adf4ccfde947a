'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState, useTransition } from 'react';
import { findingActionClass } from '@/components/finding-card';
import type { Fix } from '@/lib/domain/findings/finding';
import { ProblemError } from '@/lib/http/client';
import { applyFix } from '../api/apply-fix';
import { isRowFix } from '../row-fix';

type FixButtonsProps = { readonly siteId: string; readonly fixes: readonly Fix[] };

/** Each fix one press away; the page is read again afterwards, so that what is well goes quiet. */
export function FixButtons({ siteId, fixes }: FixButtonsProps) {
  const router = useRouter();
  const [refused, setRefused] = useState('');
  const [busy, startTransition] = useTransition();

  const press = (fix: Fix): void => {
    if (!isRowFix(fix)) return;
    startTransition(async () => {
      try {
        await applyFix(siteId, fix);
        setRefused('');
        router.refresh();
      } catch (error) {
        if (!(error instanceof ProblemError)) throw error;
        setRefused(error.problem.detail);
      }
    });
  };

  return (
    <>
      {fixes.map((fix) => (fix.kind === 'print-test'
        ? <Link key={fix.label} className={findingActionClass} href={`/sites/${siteId}/printers?printer=${encodeURIComponent(fix.printer)}#tests`}>{fix.label}</Link>
        : <button key={fix.label} type="button" className={findingActionClass} disabled={busy} onClick={() => press(fix)}>{fix.label}</button>
      ))}
      <p role="status" className="w-full text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
    </>
  );
}
