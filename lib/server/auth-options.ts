import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { env } from '@/lib/env';
import { addressOf } from './address-of';
import { checkSignIn } from './check-sign-in';
import { log } from './log';
import { endSession, startSession, type SessionClaims } from './session';
import { fortnightSeconds } from './session-cookie';

declare module 'next-auth' {
  interface Session { claims?: SessionClaims }
  interface User { claims?: SessionClaims }
}
declare module 'next-auth/jwt' {
  interface JWT { claims?: SessionClaims }
}

const headerOf = (headers: unknown, name: string): string => {
  const value = (headers as Record<string, string | string[] | undefined> | undefined)?.[name];
  return (Array.isArray(value) ? value.join(',') : value) ?? '';
};

export const authOptions = (): NextAuthOptions => ({
  secret: env().NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: fortnightSeconds },
  logger: {
    error: (code, about) => {
      // A cookie that has run out or was made up is nobody's, and no fault.
      if (code !== 'JWT_SESSION_ERROR') log.error({ code, error: about instanceof Error ? about.message : about.error.message }, 'signing in');
    },
    warn: (code) => log.warn({ code }, 'signing in'),
    debug: () => undefined,
  },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    Credentials({
      credentials: { email: {}, password: {} },
      authorize: async (credentials, request) => {
        const from = addressOf(headerOf(request.headers, 'x-forwarded-for'));
        const result = await checkSignIn(credentials?.email ?? '', credentials?.password ?? '', from);
        if (result.kind === 'wait') throw new Error(`wait-${result.seconds}`);
        if (result.kind === 'wrong') return null;
        return { id: result.person.id, claims: await startSession(result.person) };
      },
    }),
  ],
  events: {
    signOut: async ({ token }) => {
      if (token.claims !== undefined) await endSession(token.claims.sessionId);
    },
  },
  callbacks: {
    jwt: ({ token, user }) => (user?.claims === undefined ? token : { ...token, claims: user.claims }),
    session: ({ session, token }) => ({ expires: session.expires, ...(token.claims === undefined ? {} : { claims: token.claims }) }),
  },
});
