'use client';

import { useState, type ReactNode } from 'react';
import type { FieldValues } from 'react-hook-form';
import { Button } from '@/components/button';
import { SidePanel } from '@/components/side-panel';
import { ConflictNotice } from './conflict-notice';
import { LeaveGuard } from './leave-guard';
import type { SavedForm } from './use-saved-form';

type FormPanelProps<Values extends FieldValues> = {
  readonly title: string;
  readonly of: SavedForm<Values>;
  readonly leave: () => void;
  /** What the main button says. */
  readonly action?: string;
  readonly children: ReactNode;
  /** What stands under the form and is no part of it. */
  readonly below?: ReactNode;
};

/** A form in the panel at the side: saving, what somebody else saved meanwhile, and closing with something typed. */
export function FormPanel<Values extends FieldValues>({ title, of, leave, action = 'Save', children, below }: FormPanelProps<Values>) {
  const [guarded, setGuarded] = useState(false);
  const { isDirty, isSubmitting } = of.form.formState;
  const close = (): void => (isDirty ? setGuarded(true) : leave());
  return (
    <SidePanel title={title} close={close}>
      <div className="grid gap-4">
        {guarded ? <LeaveGuard stay={() => setGuarded(false)} leave={leave} /> : null}
        <form noValidate onSubmit={(event) => void of.save(event)} className="grid gap-4">
          {children}
          {of.refused?.stale === true && of.theirs !== null
            ? <ConflictNotice words={of.refused.words} differences={of.theirs} keepMine={of.keepMine} takeTheirs={of.takeTheirs} />
            : <p role="alert" className="text-[13.5px] font-semibold text-hot-text empty:hidden">{of.refused?.words}</p>}
          <div className="sticky bottom-0 flex gap-2 border-t border-line bg-panel py-3">
            <Button type="submit" kind="primary" disabled={isSubmitting}>{action}</Button>
            <Button onClick={close}>Cancel</Button>
          </div>
        </form>
        {below}
      </div>
    </SidePanel>
  );
}
