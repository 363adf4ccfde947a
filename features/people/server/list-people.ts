import 'server-only';
import { roles } from '@/lib/domain/roles/permissions';
import { mustBeAllowed, type Actor } from '@/lib/server/actor';
import { InvitationRow } from '@/models/invitation';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import type { Member, OpenInvitation } from '../view';

const byRoleThenName = (left: Member, right: Member): number => roles.indexOf(left.role) - roles.indexOf(right.role) || left.name.localeCompare(right.name);

/** Everybody on a site, owners first, and who is still to come. */
export const listPeople = async (actor: Actor, now: Date): Promise<{ readonly members: readonly Member[]; readonly invitations: readonly OpenInvitation[] }> => {
  mustBeAllowed(actor.membership, 'people.write');
  const { siteId } = actor;
  const [memberships, invitations] = await Promise.all([
    MembershipRow.findAll({ where: { siteId } }),
    InvitationRow.findAll({ where: { siteId, usedAt: null }, order: ['expiresAt', 'email'] }),
  ]);
  const inviters = invitations.flatMap(({ invitedBy }) => (invitedBy === null ? [] : [invitedBy]));
  const people = await PersonRow.findAll({ where: { id: [...memberships.map(({ personId }) => personId), ...inviters] } });
  const personOf = new Map(people.map((person) => [person.id, person]));
  const owners = memberships.filter(({ role }) => role === 'owner').length;
  const members = memberships.flatMap(({ personId, role, title, mayOverride, version }): readonly Member[] => {
    const person = personOf.get(personId);
    return person === undefined ? [] : [{
      id: personId, name: person.name, email: person.email, role, title, mayOverride, version, isYou: personId === actor.person.id, isLastOwner: role === 'owner' && owners === 1,
    }];
  });
  return {
    members: members.toSorted(byRoleThenName),
    invitations: invitations.map(({ id, email, role, title, mayOverride, invitedBy, expiresAt }) => ({
      id, email, role, title, mayOverride, invitedBy: invitedBy === null ? null : (personOf.get(invitedBy)?.name ?? null), expiresAt: expiresAt.toISOString(), isExpired: expiresAt <= now,
    })),
  };
};
