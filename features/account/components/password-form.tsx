'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { PasswordField } from '@/components/form/password-field';
import { faultOfNewPassword, shortestPassword, type PasswordOwner } from '@/lib/domain/people/new-password';
import { ProblemError } from '@/lib/http/client';
import type { Problem } from '@/lib/http/problem';
import { changePassword } from '../api/change-password';

/** What the server would say of it anyway, said without asking. */
const faultAtOnce = (wanted: string, owner: PasswordOwner): Problem['fields'] => {
  const reason = faultOfNewPassword(wanted, owner);
  return reason === null ? undefined : [{ field: 'wanted', reason }];
};

/** One's own password. Every other device has to sign in again. */
export function PasswordForm({ owner }: { readonly owner: PasswordOwner }) {
  const [fields, setFields] = useState<Problem['fields']>();
  const [said, setSaid] = useState<{ readonly words: string; readonly done: boolean } | null>(null);
  const [waiting, setWaiting] = useState(false);
  const reasonFor = (field: string): string | undefined => fields?.find((one) => one.field === field)?.reason;

  const submit = async (event: FormEvent<HTMLFormElement>): Promise<void> => {
    event.preventDefault();
    if (waiting) return;
    const form = event.currentTarget;
    const typed = new FormData(form);
    const input = { current: String(typed.get('current')), wanted: String(typed.get('wanted')) };
    const refuse = (reasons: Problem['fields']): void => {
      setFields(reasons);
      form.querySelector<HTMLInputElement>(`#${reasons?.[0]?.field ?? 'current'}`)?.focus();
    };
    const fault = faultAtOnce(input.wanted, owner);
    setSaid(null);
    if (fault !== undefined) return refuse(fault);
    setFields(undefined);
    setWaiting(true);
    try {
      await changePassword(input);
      form.reset();
      setSaid({ words: 'Your password is changed. Every other device has to sign in again; this one stays signed in.', done: true });
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      if (error.problem.fields === undefined) setSaid({ words: error.problem.detail, done: false });
      else refuse(error.problem.fields);
    } finally {
      setWaiting(false);
    }
  };

  return (
    <form method="post" noValidate onSubmit={(event) => void submit(event)} className="grid max-w-[420px] gap-4">
      <input type="hidden" name="username" autoComplete="username" value={owner.email} readOnly />
      <PasswordField id="current" name="current" label="Password now" autoComplete="current-password" required error={reasonFor('current')} />
      <PasswordField id="wanted" name="wanted" label="New password" autoComplete="new-password" required hint={`At least ${shortestPassword} characters. A few words in a row do well.`} error={reasonFor('wanted')} />
      <p role="alert" className="rounded-lg border border-hot bg-hot-tint px-3 py-2 font-semibold text-hot-text empty:hidden">{said?.done === false ? said.words : null}</p>
      <p role="status" className="rounded-lg bg-calm-tint px-3 py-2 text-calm-text empty:hidden">{said?.done === true ? said.words : null}</p>
      <p className="text-[13.5px] text-soft">Every other device that is signed in as you has to sign in again.</p>
      <div><Button type="submit" kind="primary" aria-disabled={waiting} className="min-h-12">{waiting ? 'Changing it' : 'Change my password'}</Button></div>
    </form>
  );
}
