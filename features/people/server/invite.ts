import 'server-only';
import { randomUUID } from 'node:crypto';
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';
import type { Transaction } from 'sequelize';
import { AppError } from '@/lib/http/errors';
import { actIn, mustBeAllowed, type Actor } from '@/lib/server/actor';
import { recordChange } from '@/lib/server/history';
import { sendMail } from '@/lib/server/mail';
import { InvitationRow } from '@/models/invitation';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { SiteRow } from '@/models/site';
import type { InvitationInput } from '../schema';
import { titleOrRole } from '../words';
import { invitationMail } from './invitation-mail';
import { digestOf, expiryFrom, invitationDays, newToken } from './invitation-token';

/** Enough for a new brigade in one evening, too few to send strangers mail with. */
const perInviter = new RateLimiterMemory({ keyPrefix: 'invitations', points: 30, duration: 60 * 60 });

const countInvitation = async (inviter: string): Promise<void> => {
  try {
    await perInviter.consume(inviter);
  } catch (error) {
    if (!(error instanceof RateLimiterRes)) throw error;
    const seconds = Math.ceil(error.msBeforeNext / 1000);
    throw new AppError('too-many', `You have sent 30 invitations within an hour. Nothing was sent. Go on in ${Math.ceil(seconds / 60)} minutes.`, { retryAfterSeconds: seconds });
  }
};

type Invitation = { readonly id: string; readonly token: string; readonly invited: InvitationInput };

const alreadyHere = (email: string): AppError =>
  new AppError('invalid', `${email} is on this site already. Nothing was sent.`, { fields: [{ field: 'email', reason: 'This person is on this site already; change what they are in the list.' }] });

const mustBeElsewhere = async (transaction: Transaction, siteId: string, email: string): Promise<void> => {
  const person = await PersonRow.findOne({ where: { email }, transaction });
  if (person !== null && (await MembershipRow.count({ where: { siteId, personId: person.id }, transaction })) > 0) throw alreadyHere(email);
};

/** The row has to be there before the mail, so that the link works when it arrives. Gives what stood in its place. */
const writeInvitation = (actor: Actor, { id, token, invited }: Invitation, now: Date): Promise<{ readonly site: string; readonly earlier: readonly InvitationRow[] }> =>
  actIn(actor, 'people.write', async (transaction) => {
    const { siteId } = actor;
    await mustBeElsewhere(transaction, siteId, invited.email);
    const open = { siteId, email: invited.email, usedAt: null };
    const earlier = await InvitationRow.findAll({ where: open, transaction });
    await InvitationRow.destroy({ where: open, transaction });
    await InvitationRow.create({ id, siteId, ...invited, tokenHash: digestOf(token), invitedBy: actor.person.id, expiresAt: expiryFrom(now) }, { transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'member.invited', subjectKind: 'invitation', subjectId: id, summary: `${invited.email} invited as ${titleOrRole(invited)}` });
    return { site: (await SiteRow.findByPk(siteId, { transaction }))?.name ?? siteId, earlier };
  });

/** The mail was not taken: what stood there before stands there again, and the history says both. */
const undoInvitation = (actor: Actor, { id, invited }: Invitation, earlier: readonly InvitationRow[]): Promise<void> =>
  actIn(actor, 'people.write', async (transaction) => {
    const { siteId } = actor;
    await InvitationRow.destroy({ where: { siteId, id }, transaction });
    await InvitationRow.bulkCreate(earlier.map((row) => row.get({ plain: true })), { transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'invitation.not-sent', subjectKind: 'invitation', subjectId: id, summary: `The invitation of ${invited.email} could not be sent` });
  });

const inviteAs = async (actor: Actor, id: string, input: InvitationInput, now: Date): Promise<{ readonly id: string }> => {
  mustBeAllowed(actor.membership, 'people.write');
  await countInvitation(actor.person.id);
  const invitation = { id, token: newToken(), invited: { ...input, mayOverride: input.role === 'chef' && input.mayOverride } };
  const { site, earlier } = await writeInvitation(actor, invitation, now);
  try {
    await sendMail(invitationMail(invitation.invited, { inviter: actor.person.name, site, token: invitation.token, days: invitationDays }));
  } catch (error) {
    await undoInvitation(actor, invitation, earlier);
    throw error;
  }
  return { id };
};

/** Invites somebody by e-mail. An open invitation to the same address ends: only the newest link works. */
export const invite = (actor: Actor, input: InvitationInput, now: Date): Promise<{ readonly id: string }> => inviteAs(actor, randomUUID(), input, now);

const openInvitation = async (actor: Actor, id: string): Promise<InvitationRow> => {
  mustBeAllowed(actor.membership, 'people.write');
  const row = await InvitationRow.findOne({ where: { siteId: actor.siteId, id, usedAt: null } });
  if (row === null) throw new AppError('not-found', 'This invitation is not open any more: it was used or taken back. Nothing was sent.');
  return row;
};

/** The same invitation with a new link and a new week. */
export const inviteAgain = async (actor: Actor, id: string, now: Date): Promise<{ readonly id: string }> => {
  const { email, role, title, mayOverride } = await openInvitation(actor, id);
  return inviteAs(actor, id, { email, role, title, mayOverride }, now);
};

/** Its link does nothing from now on. */
export const takeInvitationBack = (actor: Actor, id: string): Promise<{ readonly id: string }> =>
  actIn(actor, 'people.write', async (transaction) => {
    const { siteId } = actor;
    const { email } = await openInvitation(actor, id);
    await InvitationRow.destroy({ where: { siteId, id, usedAt: null }, transaction });
    await recordChange(transaction, { siteId, personId: actor.person.id, action: 'invitation.taken-back', subjectKind: 'invitation', subjectId: id, summary: `The invitation of ${email} taken back` });
    return { id };
  });
