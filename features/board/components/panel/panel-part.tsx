import type { ReactNode } from 'react';

export function PanelPart({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <section className="grid gap-2 border-t border-line pt-4">
      <h3 className="text-[13.5px] font-[640] font-stretch-[106%]">{title}</h3>
      {children}
    </section>
  );
}
