import { z } from 'zod';
import { roles } from '@/lib/domain/roles/permissions';

const id = z.string().regex(/^[A-Za-z0-9._-]{1,36}$/, 'This is nobody on this site.');

const standing = {
  role: z.enum(roles, 'Choose what this person is on the site.'),
  /** The site's own words for it: "sous-chef". */
  title: z.string().trim().max(80, 'At most 80 characters.'),
  /** Only a chef needs it: an owner may anyway, the others never. */
  mayOverride: z.boolean(),
};

export const memberInput = z.object(standing);
export type MemberInput = z.infer<typeof memberInput>;

export const invitationInput = z.object({
  email: z.string().trim().toLowerCase().max(254, 'At most 254 characters.').pipe(z.email('This is no e-mail address that a mail can be sent to.')),
  ...standing,
});
export type InvitationInput = z.infer<typeof invitationInput>;

export const memberParams = z.object({ site: z.string(), person: id });
export const invitationParams = z.object({ site: z.string(), invitation: id });

const token = z.string().min(1).max(200);

/** What somebody who has no sign-in yet says of themselves. */
export const acceptInput = z.object({
  token,
  name: z.string().trim().min(1, 'Say what you are called; the others see it beside what you change.').max(120, 'At most 120 characters.'),
  password: z.string().max(512, 'A password has at most 256 characters.'),
});
export type AcceptInput = z.infer<typeof acceptInput>;

export const joinInput = z.object({ token });
