import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { MeshMark } from '@/components/mesh-mark';
import { SignInForm } from '@/features/sign-in/components/sign-in-form';
import { currentPerson } from '@/lib/server/current-person';

export const metadata: Metadata = { title: 'Sign in' };

type SignInPageProps = { readonly searchParams: Promise<{ readonly next?: string; readonly left?: string }> };

/** Only a path of our own is gone back to. */
const ownPath = (next: string | undefined): string => (next !== undefined && /^\/(?![/\\])/.test(next) ? next : '/');

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { next, left } = await searchParams;
  if (left === undefined && (await currentPerson()) !== null) redirect(ownPath(next));
  return (
    <main className="grid min-h-dvh bg-ground md:grid-cols-[minmax(0,1fr)_minmax(0,1.1fr)]">
      <section className="relative flex flex-col justify-between gap-10 overflow-hidden bg-night px-6 py-8 text-on-night md:px-12 md:py-14">
        <p className="flex items-center gap-3 text-[24px] font-[650] font-stretch-[118%]"><MeshMark size={36} /> Tamis</p>
        <div className="grid gap-4">
          <p className="max-w-[18ch] text-[34px] leading-[1.05] font-[680] tracking-[-0.02em] font-stretch-[108%] md:text-[46px]">Every dish to the station that cooks it.</p>
          <p className="max-w-[44ch] text-[15px] text-quiet-on-night">Decide what prints where, see that nothing can be lost, and try an order before the first guest sits down.</p>
        </div>
        <svg aria-hidden viewBox="0 0 30 30" className="pointer-events-none absolute -right-24 -bottom-24 size-80 opacity-15"><circle cx="15" cy="15" r="13.6" fill="none" stroke="#fff" strokeWidth="1.4" /><clipPath id="big-drum"><circle cx="15" cy="15" r="12.6" /></clipPath><g clipPath="url(#big-drum)" stroke="#e9a58c" strokeWidth=".35"><path d="M0 3h30M0 6h30M0 9h30M0 12h30M0 15h30M0 18h30M0 21h30M0 24h30M0 27h30M3 0v30M6 0v30M9 0v30M12 0v30M15 0v30M18 0v30M21 0v30M24 0v30M27 0v30" /></g></svg>
        <p className="text-[12.5px] text-quiet-on-night">A ticket is an aid: people confirm allergies by voice.</p>
      </section>
      <section className="grid content-center justify-items-center px-6 py-10">
        <div className="grid w-full max-w-[380px] gap-5">
          <h1 className="text-[27px]">Sign in</h1>
          {left === undefined ? null : <p role="status" className="rounded-lg bg-calm-tint px-3 py-2 text-calm-text">You are signed out on this device.</p>}
          <SignInForm next={ownPath(next)} />
        </div>
      </section>
    </main>
  );
}
