import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { faultOfNewPassword } from '@/lib/domain/people/new-password';
import type { Role } from '@/lib/domain/roles/permissions';
import { AppError } from '@/lib/http/errors';
import type { Person } from '@/lib/server/actor';
import { foldEmail } from '@/lib/server/check-sign-in';
import { inTransaction } from '@/lib/server/database';
import { recordChange } from '@/lib/server/history';
import { hashPassword } from '@/lib/server/password';
import { startSession, type SessionClaims } from '@/lib/server/session';
import { InvitationRow } from '@/models/invitation';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { SiteRow } from '@/models/site';
import type { AcceptInput } from '../schema';
import { titleOrRole } from '../words';
import { digestOf } from './invitation-token';

export type Joined = { readonly siteId: string; readonly role: Role };

const over = (): AppError => new AppError('not-found', 'This invitation cannot be used any more: it was used, taken back, or is older than a week. Nothing was changed. Ask whoever invited you for another.');

/** The invitation behind a token, when it can still be used. */
const openAt = async (token: string, now: Date, transaction?: Transaction): Promise<InvitationRow | null> => {
  const within = transaction === undefined ? {} : { transaction, lock: transaction.LOCK.UPDATE };
  const row = await InvitationRow.findOne({ where: { tokenHash: digestOf(token) }, ...within });
  return row === null || row.usedAt !== null || row.expiresAt <= now ? null : row;
};

export type InvitationView = {
  readonly email: string;
  readonly role: Role;
  readonly title: string;
  readonly site: { readonly id: string; readonly name: string };
  readonly invitedBy: string | null;
  /** This address signs in already, on another site. */
  readonly isKnown: boolean;
};

/** What the page of an invitation shows; null when it leads nowhere. */
export const readInvitation = async (token: string, now: Date): Promise<InvitationView | null> => {
  const row = await openAt(token, now);
  if (row === null) return null;
  const [site, inviter, person] = await Promise.all([
    SiteRow.findByPk(row.siteId), row.invitedBy === null ? null : PersonRow.findByPk(row.invitedBy), PersonRow.findOne({ where: { email: row.email } }),
  ]);
  return { email: row.email, role: row.role, title: row.title, site: { id: row.siteId, name: site?.name ?? '' }, invitedBy: inviter?.name ?? null, isKnown: person !== null };
};

const addMember = async (transaction: Transaction, row: InvitationRow, person: Pick<Person, 'id' | 'name'>, now: Date): Promise<Joined> => {
  const { siteId, role, title, mayOverride } = row;
  await MembershipRow.create({ siteId, personId: person.id, role, title, mayOverride }, { transaction });
  await row.update({ usedAt: now }, { transaction });
  await recordChange(transaction, { siteId, personId: person.id, action: 'member.joined', subjectKind: 'membership', subjectId: person.id, summary: `${person.name} joined as ${titleOrRole(row)}` });
  return { siteId, role };
};

const mustBeNew = async (transaction: Transaction, email: string): Promise<void> => {
  if ((await PersonRow.count({ where: { email }, transaction })) === 0) return;
  throw new AppError('conflict', `${email} signs in already. Nothing was changed. Sign in as ${email}, then open the invitation again.`);
};

/** Joins with a new sign-in: the invitation proves the address, the person says the rest. */
export const joinAsNewPerson = async ({ token, name, password }: AcceptInput, now: Date): Promise<Joined & { readonly claims: SessionClaims }> => {
  const invitation = await openAt(token, now);
  if (invitation === null) throw over();
  const fault = faultOfNewPassword(password, { name, email: invitation.email });
  if (fault !== null) throw new AppError('invalid', `${fault} Nothing was changed.`, { fields: [{ field: 'password', reason: fault }] });
  const passwordHash = await hashPassword(password);
  const person = { id: randomUUID(), name };
  const joined = await inTransaction(async (transaction) => {
    const row = await openAt(token, now, transaction);
    if (row === null) throw over();
    await mustBeNew(transaction, row.email);
    await PersonRow.create({ ...person, email: row.email, passwordHash, createdAt: now }, { transaction });
    return addMember(transaction, row, person, now);
  });
  return { ...joined, claims: await startSession({ id: person.id, sessionVersion: 1 }) };
};

/** Joins as who one is already. */
export const joinAs = (person: Person, token: string, now: Date): Promise<Joined> =>
  inTransaction(async (transaction) => {
    const row = await openAt(token, now, transaction);
    if (row === null) throw over();
    if (foldEmail(row.email) !== foldEmail(person.email)) throw new AppError('not-allowed', `This invitation is for ${row.email}, and you are signed in as ${person.email}. Nothing was changed. Sign out, then sign in as ${row.email}.`);
    if ((await MembershipRow.count({ where: { siteId: row.siteId, personId: person.id }, transaction })) > 0) throw new AppError('conflict', 'You are on this site already. Nothing was changed. Open it from your sites.');
    return addMember(transaction, row, person, now);
  });
