import type { Metadata } from 'next';
import { PageHead } from '@/components/page-head';
import { PersonMenu } from '@/components/person-menu';
import { Rail } from '@/components/rail';
import { TopBar } from '@/components/top-bar';
import { PasswordForm } from '@/features/account/components/password-form';
import { chosenLight } from '@/lib/server/chosen-light';
import { mySites } from '@/lib/server/page-access';

export const metadata: Metadata = { title: 'Change my password' };

export default async function AccountPage() {
  const [{ person, sites }, light] = await Promise.all([mySites(), chosenLight()]);
  return (
    <>
      <header>
        <TopBar home="/"><PersonMenu person={{ name: person.name, title: '' }} light={light} manySites={sites.length > 1} /></TopBar>
        <Rail />
      </header>
      <main className="pt-3">
        <PageHead title="Change my password" sub={person.email} />
        <div className="px-4 py-4 md:px-[22px]"><PasswordForm /></div>
      </main>
    </>
  );
}
