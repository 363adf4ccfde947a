import type { Metadata } from 'next';
import { PageHead } from '@/components/page-head';
import { PersonMenu } from '@/components/person-menu';
import { Rail } from '@/components/rail';
import { TopBar } from '@/components/top-bar';
import { PasswordForm } from '@/features/account/components/password-form';
import { homePath } from '@/lib/navigation';
import { chosenLight } from '@/lib/server/chosen-light';
import { mySites } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Change my password' };

export default async function AccountPage() {
  const [{ person, sites }, light] = await Promise.all([mySites(), chosenLight()]);
  const [only] = sites;
  const home = sites.length === 1 && only !== undefined ? homePath(only.id, only.membership.role) : '/sites';
  return (
    <>
      <header>
        <TopBar home={home}><PersonMenu person={{ name: person.name, title: '' }} light={light} manySites={sites.length > 1} /></TopBar>
        <Rail />
      </header>
      <main className="pt-3">
        <PageHead title="Change my password" sub={`You sign in as ${person.email}.`} />
        <div className="px-4 py-5 md:px-[22px]"><PasswordForm owner={{ name: person.name, email: person.email }} /></div>
      </main>
    </>
  );
}
