'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { PasswordField } from '@/components/form/password-field';
import { TextField } from '@/components/form/text-field';
import { shortestPassword } from '@/lib/domain/people/new-password';
import { ProblemError } from '@/lib/http/client';
import type { Problem } from '@/lib/http/problem';
import { homePath } from '@/lib/navigation';
import { joinAsNewPerson } from '../api/people';

/** A name and a password: all that joining takes. */
export function JoinForm({ token, email }: { readonly token: string; readonly email: string }) {
  const [problem, setProblem] = useState<Problem | null>(null);
  const [waiting, setWaiting] = useState(false);
  const reasonFor = (field: string): string | undefined => problem?.fields?.find((one) => one.field === field)?.reason;
  const submit = async (event: FormEvent<HTMLFormElement>): Promise<void> => {
    event.preventDefault();
    if (waiting) return;
    const form = event.currentTarget;
    const typed = new FormData(form);
    setWaiting(true);
    setProblem(null);
    try {
      const { siteId, role } = await joinAsNewPerson({ token, name: String(typed.get('name')), password: String(typed.get('password')) });
      location.assign(homePath(siteId, role));
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setProblem(error.problem);
      setWaiting(false);
      form.querySelector<HTMLInputElement>(`#${error.problem.fields?.[0]?.field ?? 'name'}`)?.focus();
    }
  };
  return (
    <form method="post" noValidate onSubmit={(event) => void submit(event)} className="grid gap-4">
      <TextField id="join-email" label="E-mail" value={email} readOnly autoComplete="username" hint="You sign in with it from now on." className="min-h-12 text-[16px]" />
      <TextField id="name" name="name" label="Your name" autoComplete="name" hint="Shown beside what you change." className="min-h-12 text-[16px]" error={reasonFor('name')} />
      <PasswordField id="password" name="password" label="Choose a password" autoComplete="new-password" hint={`At least ${shortestPassword} characters. A few words in a row do well.`} error={reasonFor('password')} />
      <p role="alert" className="rounded-lg border border-hot bg-hot-tint px-3 py-2 font-semibold text-hot-text empty:hidden">{problem === null || problem.fields !== undefined ? null : problem.detail}</p>
      <Button type="submit" kind="primary" aria-disabled={waiting} className="min-h-12 text-[16px]">{waiting ? 'Joining' : 'Join'}</Button>
    </form>
  );
}
