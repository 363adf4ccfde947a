import type { Role } from '@/lib/domain/roles/permissions';

export type Member = {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly title: string;
  readonly mayOverride: boolean;
  readonly version: number;
  /** The one who looks. */
  readonly isYou: boolean;
  /** Nobody else owns the site, so that this one stays and stays the owner. */
  readonly isLastOwner: boolean;
};

export type OpenInvitation = {
  readonly id: string;
  readonly email: string;
  readonly role: Role;
  readonly title: string;
  readonly mayOverride: boolean;
  /** Null when whoever invited is gone. */
  readonly invitedBy: string | null;
  /** ISO 8601, UTC. */
  readonly expiresAt: string;
  readonly isExpired: boolean;
};

export type PeopleView = { readonly siteId: string; readonly timeZone: string; readonly members: readonly Member[]; readonly invitations: readonly OpenInvitation[] };
