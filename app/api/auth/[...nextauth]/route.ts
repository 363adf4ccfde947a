import NextAuth from 'next-auth';
import { authOptions } from '@/lib/server/auth-options';

type Context = { readonly params: Promise<{ readonly nextauth: string[] }> };

const handler = (request: Request, context: Context): Promise<Response> => NextAuth(request as never, context as never, authOptions()) as Promise<Response>;

export { handler as GET, handler as POST };
