import 'server-only';
import type { Transaction } from 'sequelize';
import { may, type Membership, type Permission } from '@/lib/domain/roles/permissions';
import { AppError } from '@/lib/http/errors';
import { inTransaction } from './database';

export type Person = { readonly id: string; readonly name: string; readonly email: string };

/** What a person is on one site, with the words the site uses for it ("head chef"). */
export type SiteMembership = Membership & { readonly title: string };

/** Who acts, on which site, as what. Every use case takes one. */
export type Actor = { readonly person: Person; readonly membership: SiteMembership; readonly siteId: string };

const roleWords = { owner: 'the owner', chef: 'a chef', installer: 'the installer', trainer: 'the trainer' } as const;

/** Throws when this person may not; the check stands where data is read and written, whatever a page has shown. */
export const mustBeAllowed = (membership: Membership, permission: Permission): void => {
  if (may(membership, permission)) return;
  throw new AppError('not-allowed', `This is not for ${roleWords[membership.role]} of this site to do. Nothing was changed. Ask the owner, who can change who may do what.`);
};

/** One action of one person: allowed or refused, then all of it or nothing. */
export const actIn = async <Value>(actor: Actor, permission: Permission, work: (transaction: Transaction) => Promise<Value>): Promise<Value> => {
  mustBeAllowed(actor.membership, permission);
  return inTransaction(work);
};
