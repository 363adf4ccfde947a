import type { Metadata } from 'next';
import { ButtonLink } from '@/components/button-link';
import { HangingPaper } from '@/components/hanging-paper';
import { MessagePage } from '@/components/message-page';
import { Rail } from '@/components/rail';
import { TopBar } from '@/components/top-bar';
import { JoinButton } from '@/features/people/components/join-button';
import { JoinForm } from '@/features/people/components/join-form';
import { readInvitation, type InvitationView } from '@/features/people/server/join';
import { titleOrRole } from '@/features/people/words';
import type { Person } from '@/lib/server/actor';
import { foldEmail } from '@/lib/server/check-sign-in';
import { currentPerson } from '@/lib/server/current-person';

/** The address of this page is a key: no other page is told of it, and no search engine keeps it. */
export const metadata: Metadata = { title: 'Invitation', referrer: 'no-referrer', robots: { index: false } };

type WayProps = { readonly token: string; readonly invitation: InvitationView; readonly person: Person | null };

/** How this visitor joins: with a new sign-in, with the one they are signed in with, or after signing in. */
function WayIn({ token, invitation, person }: WayProps) {
  const { email, isKnown, site } = invitation;
  if (!isKnown && person === null) return <JoinForm token={token} email={email} />;
  if (person !== null && foldEmail(person.email) === foldEmail(email)) return <JoinButton token={token} site={site.name} />;
  if (person === null) {
    return (
      <>
        <p>You sign in as {email} already, so no new password is needed.</p>
        <ButtonLink kind="primary" className="min-h-12 text-[16px]" href={`/sign-in?next=${encodeURIComponent(`/invitation/${token}`)}`}>Sign in to join</ButtonLink>
      </>
    );
  }
  return (
    <>
      <p>The invitation is for {email}, and this device is signed in as {person.email}. Sign out here, then open the link again.</p>
      <form action="/api/account/sign-out" method="post"><button className="min-h-11 font-semibold underline underline-offset-3">Sign out on this device</button></form>
    </>
  );
}

export default async function InvitationPage({ params }: { readonly params: Promise<{ readonly token: string }> }) {
  const { token } = await params;
  const [invitation, person] = await Promise.all([readInvitation(token, new Date()), currentPerson()]);
  if (invitation === null) {
    return (
      <MessagePage title="This invitation is over" words="It was used, taken back, or is older than a week. If you joined with it, sign in. If not, ask whoever invited you for another; it takes them one press.">
        <ButtonLink kind="primary" href="/sign-in">Sign in</ButtonLink>
      </MessagePage>
    );
  }
  const { site, invitedBy } = invitation;
  return (
    <>
      <header><TopBar home={null} /><Rail /></header>
      <main className="px-4 pb-12">
        <HangingPaper className="mx-auto -mt-[5px] grid max-w-[440px] gap-5 px-6 pt-14 pb-8 md:px-8">
          <h1 className="text-[27px]">Join {site.name}</h1>
          <p className="text-soft">{invitedBy ?? 'The site'} invites you to {site.name}, as {titleOrRole(invitation)}.</p>
          <WayIn token={token} invitation={invitation} person={person} />
        </HangingPaper>
      </main>
    </>
  );
}
