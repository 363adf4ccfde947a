import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { HangingPaper } from '@/components/hanging-paper';
import { Rail } from '@/components/rail';
import { TopBar } from '@/components/top-bar';
import { SignInForm } from '@/features/sign-in/components/sign-in-form';
import { WhatItDoes } from '@/features/sign-in/components/what-it-does';
import { ownPath } from '@/lib/http/own-path';
import { currentPerson } from '@/lib/server/current-person';

export const metadata: Metadata = { title: 'Sign in' };

type SignInPageProps = { readonly searchParams: Promise<{ readonly next?: string; readonly left?: string; readonly changed?: string }> };

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { next, left, changed } = await searchParams;
  if (left === undefined && (await currentPerson()) !== null) redirect(ownPath(next));
  return (
    <>
      <header><TopBar home={null} /><Rail /></header>
      <main className="mx-auto grid max-w-[1180px] gap-x-16 gap-y-9 px-4 pb-12 max-md:pt-8 md:grid-cols-[minmax(0,1fr)_minmax(0,408px)] md:px-[22px]">
        <div className="md:order-last">
          <Rail className="-mx-4 md:hidden" />
          <HangingPaper className="-mt-[5px] grid gap-5 px-6 pt-9 pb-7 md:px-8 md:pt-14 md:pb-9">
            <h1 className="text-[27px]">Sign in</h1>
            {left === undefined ? null : <p role="status" className="rounded-lg bg-calm-tint px-3 py-2 text-calm-text">You are signed out on this device.</p>}
            {changed === undefined ? null : <p role="status" className="rounded-lg bg-calm-tint px-3 py-2 text-calm-text">Your password is changed and you are signed out everywhere. Sign in with the new one.</p>}
            <SignInForm next={ownPath(next)} />
            <p className="text-[13px] text-soft">No sign-in yet? The owner of your site can invite you.</p>
          </HangingPaper>
        </div>
        <div className="max-md:order-first md:pt-24"><WhatItDoes /></div>
      </main>
    </>
  );
}
