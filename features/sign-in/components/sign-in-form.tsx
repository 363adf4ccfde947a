'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';

const input = 'min-h-12 w-full rounded-md border border-line-strong bg-raised px-3 text-[16px] text-ink';

/** What the answer of the sign-in means, in words; null when it let the person in. */
export const refusalWords = (url: string): string | null => {
  const error = new URL(url, 'http://localhost').searchParams.get('error');
  if (error === null) return null;
  const wait = /^wait-(\d+)$/.exec(error)?.[1];
  if (wait !== undefined) {
    const minutes = Math.max(1, Math.ceil(Number(wait) / 60));
    return `There were too many wrong passwords, so none is looked at for now. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again.`;
  }
  return error === 'CredentialsSignin'
    ? 'The e-mail and the password do not belong together. Check both, then try again.'
    : 'Signing in did not work this time. Your password was not looked at. Try again in a moment.';
};

const signIn = async (email: string, password: string): Promise<string | null> => {
  const { csrfToken } = (await (await fetch('/api/auth/csrf')).json()) as { csrfToken: string };
  const answer = await fetch('/api/auth/callback/credentials', {
    method: 'POST',
    headers: { 'Content-Type': 'application/x-www-form-urlencoded' },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true', callbackUrl: location.origin }),
  });
  const { url } = (await answer.json()) as { url: string };
  return refusalWords(url);
};

export function SignInForm({ next }: { readonly next: string }) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const [waiting, setWaiting] = useState(false);
  const submit = async (event: FormEvent<HTMLFormElement>): Promise<void> => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    setWaiting(true);
    const words = await signIn(String(form.get('email')), String(form.get('password')))
      .catch(() => 'Tamis cannot be reached. Check the network, then try again.');
    if (words === null) location.assign(next);
    else {
      setRefusal(words);
      setWaiting(false);
    }
  };
  return (
    <form method="post" onSubmit={(event) => void submit(event)} className="grid gap-4">
      <div className="grid gap-1">
        <label htmlFor="email" className="text-[13.5px] font-semibold text-soft">E-mail</label>
        <input id="email" name="email" type="email" autoComplete="username" required className={input} />
      </div>
      <div className="grid gap-1">
        <label htmlFor="password" className="text-[13.5px] font-semibold text-soft">Password</label>
        <input id="password" name="password" type="password" autoComplete="current-password" required className={input} />
      </div>
      <p role="alert" className="rounded-lg bg-hot-tint px-3 py-2 text-hot-text empty:hidden">{refusal}</p>
      <Button type="submit" kind="primary" disabled={waiting} className="min-h-12 text-[16px]">{waiting ? 'Signing in' : 'Sign in'}</Button>
    </form>
  );
}
