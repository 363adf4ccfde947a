import Link from 'next/link';
import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/button-link';
import { DeviceTable } from '@/components/device-table';
import { findingActionClass } from '@/components/finding-card';
import { PageHead } from '@/components/page-head';
import { Tag } from '@/components/tag';
import { sayInstant } from '@/lib/domain/devices/say-instant';
import type { Member, OpenInvitation, PeopleView } from '../view';
import { roleWords } from '../words';
import { InvitationButtons } from './invitation-buttons';

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

const saySize = ({ members, invitations }: PeopleView): string =>
  [counted(members.length, 'person', 'people'), ...(invitations.length === 0 ? [] : [`${counted(invitations.length, 'invitation', 'invitations')} not answered yet`])].join(', ');

function Standing({ role, title, mayOverride }: Pick<Member, 'role' | 'title' | 'mayOverride'>) {
  return (
    <span className="flex flex-wrap items-center gap-x-2 gap-y-1">
      <span>{roleWords[role]}{title === '' || title.toLowerCase() === role ? null : <span className="text-soft">, {title}</span>}</span>
      {role === 'chef' && mayOverride ? <Tag>May override a stop</Tag> : null}
    </span>
  );
}

const memberRow = (siteId: string, member: Member) => ({
  id: member.id,
  name: <><b>{member.name}</b>{member.isYou ? <span className="text-soft"> (you)</span> : null}</>,
  cells: [
    <Standing key="standing" {...member} />,
    <span key="email" className="break-all">{member.email}</span>,
    <Link key="edit" className={findingActionClass} href={`/sites/${siteId}/people?person=${member.id}`} scroll={false} aria-label={`Edit ${member.name}`}>Edit</Link>,
  ],
  findings: null,
});

const invitationRow = ({ siteId, timeZone }: PeopleView, invitation: OpenInvitation) => ({
  id: invitation.id,
  name: <b className="break-all">{invitation.email}</b>,
  cells: [
    <Standing key="standing" {...invitation} />,
    invitation.invitedBy ?? 'Somebody who has left',
    invitation.isExpired ? <Tag key="until" tone="look">Expired</Tag> : sayInstant(invitation.expiresAt, timeZone),
    <InvitationButtons key="buttons" siteId={siteId} invitation={invitation.id} email={invitation.email} />,
  ],
  findings: null,
});

/** Everybody on a site and what they may, and who is still to come. */
export function PeoplePage({ view, panel }: { readonly view: PeopleView; readonly panel: ReactNode }) {
  return (
    <>
      <PageHead title="People" sub={`${saySize(view)}.`}>
        <ButtonLink kind="primary" href={`/sites/${view.siteId}/people?invite=new`} scroll={false}>Invite somebody</ButtonLink>
      </PageHead>
      <div className="grid gap-4 px-4 py-4 md:px-[22px]">
        <h2 className="sr-only">People of this site</h2>
        <DeviceTable caption="People" columns={['Person', 'May do', 'Signs in as', '']} rows={view.members.map((member) => memberRow(view.siteId, member))} />
        {view.invitations.length === 0 ? null : (
          <>
            <h2 className="mt-3 text-[19px] font-[680]">Invited, not here yet</h2>
            <DeviceTable caption="Invitations" columns={['Invited', 'As', 'By', 'Link works until', '']} rows={view.invitations.map((invitation) => invitationRow(view, invitation))} />
          </>
        )}
      </div>
      {panel}
    </>
  );
}
