import { NextResponse, type NextRequest } from 'next/server';

/** Tells pages which address was asked for, so that signing in can come back to it. It decides nothing. */
export const proxy = (request: NextRequest): NextResponse => {
  const headers = new Headers(request.headers);
  headers.set('x-tamis-path', request.nextUrl.pathname + request.nextUrl.search);
  return NextResponse.next({ request: { headers } });
};

export const config = { matcher: ['/((?!_next/|api/|icon|favicon).*)'] };
