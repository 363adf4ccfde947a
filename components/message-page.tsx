import type { ReactNode } from 'react';
import { MeshMark } from './mesh-mark';

/** A whole page for one message: what happened, what it means for service, and what to press. */
export function MessagePage({ title, words, children }: { readonly title: string; readonly words: string; readonly children?: ReactNode }) {
  return (
    <main className="grid min-h-[70dvh] content-center justify-items-start gap-4 px-6 py-12 sm:mx-auto sm:max-w-[640px]">
      <MeshMark size={40} />
      <h1 className="text-[29px]">{title}</h1>
      <p className="text-[16px] text-soft">{words}</p>
      <div className="flex flex-wrap gap-2.5">{children}</div>
    </main>
  );
}
