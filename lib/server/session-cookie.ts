import 'server-only';
import { encode } from 'next-auth/jwt';
import { env } from '@/lib/env';
import type { SessionClaims } from './session';

/** A fortnight: long enough for a tablet at the pass, and any session can be ended sooner. */
export const fortnightSeconds = 14 * 24 * 60 * 60;

const isSecure = (): boolean => env().NEXTAUTH_URL.startsWith('https:');

/** The name that next-auth reads the session from. */
export const sessionCookieName = (): string => (isSecure() ? '__Secure-next-auth.session-token' : 'next-auth.session-token');

const withAttributes = (name: string, value: string, maxAgeSeconds: number): string =>
  `${name}=${value}; Path=/; Max-Age=${maxAgeSeconds}; HttpOnly; SameSite=Lax${isSecure() ? '; Secure' : ''}`;

/** A Set-Cookie value that makes this browser hold the session; no script can read it, and other sites' forms do not send it. */
export const sessionCookie = async (claims: SessionClaims): Promise<string> =>
  withAttributes(sessionCookieName(), await encode({ token: { claims }, secret: env().NEXTAUTH_SECRET, maxAge: fortnightSeconds }), fortnightSeconds);

/** A Set-Cookie value that makes this browser forget it. */
export const noSessionCookie = (): string => withAttributes(sessionCookieName(), '', 0);
