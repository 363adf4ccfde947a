import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

export const invitationDays = 7;

const dayMs = 24 * 60 * 60 * 1000;

export const expiryFrom = (now: Date): Date => new Date(now.getTime() + invitationDays * dayMs);

/** 192 bits by chance, so that a quick digest is enough: nobody can go through them. As short as that, to fit one line of a mail. */
export const newToken = (): string => randomBytes(24).toString('base64url');

/** What is kept of a token; whoever reads the table cannot join with it. */
export const digestOf = (token: string): string => createHash('sha256').update(token).digest('hex');
