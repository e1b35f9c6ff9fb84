import { type NextRequest, NextResponse } from 'next/server';
import { paths } from '@/lib/paths';

/** Somebody without a session is shown the door at once, and comes back to where they were going. Pages check for real. */
export function proxy(request: NextRequest) {
  const hasSession = request.cookies
    .getAll()
    .some(({ name }) => name.endsWith('setwell.session_token'));
  if (hasSession) return NextResponse.next();
  const { pathname, search } = request.nextUrl;
  return NextResponse.redirect(new URL(paths.signIn(`${pathname}${search}`), request.url));
}

export const config = {
  matcher: [
    '/bench/:path*',
    '/crews/:path*',
    '/days/:path*',
    '/diary/:path*',
    '/jobs/:path*',
    '/messages/:path*',
    '/numbers/:path*',
    '/rules/:path*',
    '/snags/:path*',
    '/start/:path*',
    '/today/:path*',
    '/walls/:path*',
  ],
};
