import type { ReactNode } from 'react';
import type { Severity } from '@/lib/domain/findings/finding';
import { SeverityMark } from './severity-mark';

type FindingCardProps = {
  readonly severity: Severity;
  readonly title: string;
  readonly message: string;
  /** What can be done about it, each one press. */
  readonly children?: ReactNode;
};

/** What a check has to say: the shape, the sentence, what it means, and its mend. */
export function FindingCard({ severity, title, message, children }: FindingCardProps) {
  return (
    <article className="rounded-lg border border-line bg-raised px-[13px] py-[11px]">
      <h3 className="flex gap-[7px] font-[640] leading-tight"><SeverityMark severity={severity} /><span>{title}</span></h3>
      {message === '' ? null : <p className="mt-1 text-[12.5px] text-soft">{message}</p>}
      {children === undefined || children === null ? null : <div className="mt-1.5 flex flex-wrap items-center gap-x-3.5 gap-y-1">{children}</div>}
    </article>
  );
}

/** How an action inside a finding looks: plain words, underlined. */
export const findingActionClass = 'inline-flex min-h-6 items-center text-left text-[12.5px] font-semibold underline underline-offset-3 pointer-coarse:min-h-10';
