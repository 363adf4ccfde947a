import 'server-only';
import type { Role } from '@/lib/domain/roles/permissions';
import { env } from '@/lib/env';
import type { Mail } from '@/lib/server/mail';

type Invited = { readonly email: string; readonly role: Role; readonly title: string };
type From = { readonly inviter: string; readonly site: string; readonly token: string; readonly days: number };

const article = (words: string): string => (/^[aeiou]/i.test(words) ? 'an' : 'a');

/** The words of an invitation, with the only copy of its link. */
export const invitationMail = ({ email, role, title }: Invited, { inviter, site, token, days }: From): Mail => {
  const as = title === '' ? `${article(role)} ${role}` : title;
  return {
    to: email,
    subject: `${inviter} invites you to ${site}`,
    text: [
      `${inviter} invites you to ${site} on Tamis, as ${as}.`,
      'Tamis decides what prints where in the kitchen. To join, open this page\nand choose a password:',
      `${env().NEXTAUTH_URL.replace(/\/$/, '')}/invitation/${token}`,
      `The page works once and for ${days} days, for whoever has this e-mail.\nIf you did not expect it, do nothing: without you, nothing happens.`,
    ].join('\n\n'),
  };
};
