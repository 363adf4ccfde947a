'use client';

import { useEffect, type FormEvent, type ReactNode } from 'react';
import { Button } from '@/components/button';
import { ConflictNotice } from './conflict-notice';

type Difference = { readonly label: string; readonly from: string; readonly to: string };

/** What a form that saves against a version has to offer, whatever it is a form of. */
export type Saving = {
  /** Null while the thing is new. */
  readonly base: object | null;
  readonly refused: { readonly words: string; readonly stale: boolean } | null;
  /** What somebody else changed since; null when nobody did. */
  readonly theirs: readonly Difference[] | null;
  readonly keepMine: () => void;
  readonly takeTheirs: () => void;
  readonly save: (event: FormEvent<HTMLFormElement>) => unknown;
  readonly form: { readonly formState: { readonly isDirty: boolean; readonly isSubmitting: boolean } };
};

type SaveFormProps = { readonly of: Saving; readonly close: () => void; readonly typed: (dirty: boolean) => void; readonly children: ReactNode };

/** The frame of a form in a panel: its fields, what was refused and why, and the two buttons at its foot. */
export function SaveForm({ of, close, typed, children }: SaveFormProps) {
  const { isDirty, isSubmitting } = of.form.formState;
  useEffect(() => typed(isDirty), [typed, isDirty]);
  return (
    <form noValidate onSubmit={(event) => void of.save(event)} className="grid gap-4">
      {children}
      {of.refused?.stale === true && of.theirs !== null ? (
        <ConflictNotice words={of.refused.words} differences={of.theirs} keepMine={of.keepMine} takeTheirs={of.takeTheirs} />
      ) : of.refused === null ? null : <p role="alert" className="text-[13.5px] font-semibold text-hot-text">{of.refused.words}</p>}
      <div className="sticky bottom-0 z-10 flex gap-2 border-t border-line bg-panel py-3">
        <Button type="submit" kind="primary" disabled={isSubmitting}>{of.base === null ? 'Add it' : 'Save'}</Button>
        <Button onClick={close}>Cancel</Button>
      </div>
    </form>
  );
}
