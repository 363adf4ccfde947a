import type { ReactNode } from 'react';

export type FieldProps = {
  /** The control's id, so that its label and its notes belong to it. */
  readonly id: string;
  readonly label: string;
  readonly hint?: string;
  /** Why it cannot be saved like this. */
  readonly error?: string | undefined;
  /** What the checks say of it. */
  readonly notes?: ReactNode;
  readonly children: ReactNode;
};

/** Ids of what describes a control, for aria-describedby. */
export const describedBy = (id: string): string => `${id}-hint ${id}-error ${id}-notes`;

/** One control with its label above and everything there is to say of it below. */
export function Field({ id, label, hint, error, notes, children }: FieldProps) {
  return (
    <div className="grid content-start gap-1">
      <label htmlFor={id} className="text-[12.5px] font-semibold text-soft">{label}</label>
      {children}
      <p id={`${id}-hint`} hidden={hint === undefined} className="text-[12.5px] text-quiet">{hint}</p>
      <p id={`${id}-error`} hidden={error === undefined} className="text-[12.5px] font-semibold text-hot-text">{error}</p>
      <div id={`${id}-notes`} aria-live="polite" className="grid gap-1.5 empty:hidden">{notes}</div>
    </div>
  );
}

/** What every text box and choice of a form looks like. */
export const controlClass = 'min-h-10 w-full min-w-0 rounded-md border border-line-strong bg-raised px-2.5 text-[14px] text-ink aria-invalid:border-hot disabled:text-quiet';
