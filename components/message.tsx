import type { ReactNode } from 'react';

export type MessageProps = { readonly title: string; readonly words: string; readonly children?: ReactNode };

/** One message in place of a page: what happened, what it means for service, and what to press. */
export function Message({ title, words, children }: MessageProps) {
  return (
    <section className="grid max-w-[640px] justify-items-start gap-3.5 px-4 py-12 md:px-[22px] md:py-16">
      <h1 className="text-[29px]">{title}</h1>
      <p className="text-[16px] text-soft">{words}</p>
      <div className="mt-1.5 flex flex-wrap gap-2.5">{children}</div>
    </section>
  );
}
