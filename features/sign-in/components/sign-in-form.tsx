'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { signIn } from '../api/sign-in';

const box = 'min-h-12 w-full rounded-md border border-line-strong bg-raised px-3 text-[16px] text-ink';
const label = 'text-[13.5px] font-semibold text-soft';

export function SignInForm({ next }: { readonly next: string }) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const [waiting, setWaiting] = useState(false);
  const submit = async (event: FormEvent<HTMLFormElement>): Promise<void> => {
    event.preventDefault();
    if (waiting) return;
    const form = new FormData(event.currentTarget);
    setWaiting(true);
    setRefusal(null);
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
        <label htmlFor="email" className={label}>E-mail</label>
        <input id="email" name="email" type="email" autoComplete="username" required className={box} />
      </div>
      <div className="grid gap-1">
        <label htmlFor="password" className={label}>Password</label>
        <input id="password" name="password" type="password" autoComplete="current-password" required className={box} />
      </div>
      <p role="alert" className="rounded-lg border border-hot bg-hot-tint px-3 py-2 font-semibold text-hot-text empty:hidden">{refusal}</p>
      <noscript><p className="rounded-lg bg-look-tint px-3 py-2 text-look-text">Signing in needs JavaScript, which is switched off in this browser. Switch it on, then load this page again.</p></noscript>
      <Button type="submit" kind="primary" aria-disabled={waiting} className="min-h-12 text-[16px]">{waiting ? 'Signing in' : 'Sign in'}</Button>
    </form>
  );
}
