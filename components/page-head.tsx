import type { ReactNode } from 'react';

type PageHeadProps = { readonly title: string; readonly sub?: ReactNode; readonly children?: ReactNode };

/** The head of a page: what it is, one line about it, and what can be done at the right. */
export function PageHead({ title, sub, children }: PageHeadProps) {
  return (
    <header className="flex min-h-14 flex-wrap items-center gap-x-3.5 gap-y-2 px-4 pt-3.5 md:px-[22px]">
      <h1>{title}</h1>
      {sub === undefined ? null : <p className="text-[13px] text-soft">{sub}</p>}
      <div className="flex flex-wrap items-center gap-x-3.5 gap-y-2 empty:hidden md:ml-auto">{children}</div>
    </header>
  );
}
