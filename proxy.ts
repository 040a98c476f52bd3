import { getToken } from 'next-auth/jwt';
import { type NextRequest, NextResponse } from 'next/server';

/** Sends whoever is signed out to sign-in and back, and gives each request an id. Authorization lives in the data layer. */
export async function proxy(request: NextRequest) {
  const { pathname, search } = request.nextUrl;
  const needsSession = /^\/(homes|work|operator|account)(\/|$)/.test(pathname);
  if (needsSession && !(await getToken({ req: request }))) {
    const target = new URL('/sign-in', process.env.NEXTAUTH_URL ?? request.url);
    target.searchParams.set('callbackUrl', `${pathname}${search}`);
    return NextResponse.redirect(target);
  }
  const headers = new Headers(request.headers);
  headers.set('x-request-id', crypto.randomUUID().slice(0, 8));
  headers.set('x-request-path', `${pathname}${search}`);
  return NextResponse.next({ request: { headers } });
}

export const config = { matcher: ['/((?!_next/|icon\\.svg|favicon\\.ico).*)'] };
