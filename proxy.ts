import { withAuth } from 'next-auth/middleware';

/** Sends the signed-out to sign in: a courtesy. Every page, action and route checks for itself. */
export const proxy = withAuth({ pages: { signIn: '/sign-in' } });

export const config = {
  // Route handlers answer for themselves; a body that passes here would be cut at 10 MB.
  matcher: ['/((?!api|_next|sign-in|status|icon|favicon|fonts|manifest|.*\\.(?:svg|png|ico|webmanifest|woff2)$).*)'],
};
