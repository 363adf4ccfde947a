import type { ReactNode } from 'react';

/** A group of fields that belong together, under its own heading. */
export function FormPart({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <section aria-label={title} className="grid gap-3 border-t border-line pt-4">
      <h3 className="text-[13.5px] font-semibold">{title}</h3>
      {children}
    </section>
  );
}

export const twoColumns = 'grid grid-cols-2 gap-3 max-[430px]:grid-cols-1';
