import type { ReactNode } from 'react';

/** An empty screen says what to do first, and offers to do it. */
export function EmptyState({ title, words, children }: { readonly title: string; readonly words: string; readonly children?: ReactNode }) {
  return (
    <section className="grid justify-items-start gap-3 rounded-[9px] border-[1.5px] border-dashed border-line-strong p-6">
      <h2 className="text-[19px] font-[680]">{title}</h2>
      <p className="max-w-[60ch] text-soft">{words}</p>
      {children}
    </section>
  );
}
