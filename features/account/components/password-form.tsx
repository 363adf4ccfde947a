'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/button';
import { sendNewPassword } from '../api/password';

const input = 'min-h-12 w-full rounded-md border border-line-strong bg-raised px-3 text-[16px] text-ink';

/** Two passwords and what follows from pressing the button, said before it. */
export function PasswordForm() {
  const [refused, setRefused] = useState('');
  const [waiting, setWaiting] = useState(false);
  const submit = async (event: FormEvent<HTMLFormElement>): Promise<void> => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    setWaiting(true);
    try {
      await sendNewPassword(String(form.get('current')), String(form.get('next')));
      location.assign('/sign-in?changed=1');
    } catch (error) {
      const fields = (error as { problem?: { fields?: readonly { reason: string }[] } }).problem?.fields ?? [];
      setRefused([(error as Error).message, ...fields.map((field) => field.reason)].join(' '));
      setWaiting(false);
    }
  };
  return (
    <form method="post" onSubmit={(event) => void submit(event)} className="grid max-w-[420px] gap-4">
      <div className="grid gap-1">
        <label htmlFor="current" className="text-[13.5px] font-semibold text-soft">Present password</label>
        <input id="current" name="current" type="password" autoComplete="current-password" required className={input} />
      </div>
      <div className="grid gap-1">
        <label htmlFor="next" className="text-[13.5px] font-semibold text-soft">New password</label>
        <input id="next" name="next" type="password" autoComplete="new-password" required minLength={8} maxLength={256} aria-describedby="next-hint" className={input} />
        <p id="next-hint" className="text-[12.5px] text-quiet">At least 8 characters. Three words that belong to nothing are better than one with a number.</p>
      </div>
      <p role="alert" className="rounded-lg bg-hot-tint px-3 py-2 text-hot-text empty:hidden">{refused}</p>
      <p className="text-[13.5px] text-soft">You are signed out everywhere, on this device too, and sign in again with the new one.</p>
      <Button type="submit" kind="primary" disabled={waiting} className="min-h-12 text-[16px]">Change my password</Button>
    </form>
  );
}
