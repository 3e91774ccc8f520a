import { NextResponse, type NextRequest } from 'next/server';
import { noncePolicy } from '@/lib/pages/csp.mjs';
import { missingPage } from '@/lib/pages/folder.mjs';

const HEADER = 'content-security-policy';

/** Turbopack's development scripts use eval, and its styles are inline. */
const loosened = (policy: string) =>
  policy
    .replace("script-src 'nonce-", "script-src 'self' 'unsafe-eval' 'nonce-")
    .replace("style-src 'self'", "style-src 'self' 'unsafe-inline'")
    .replace("connect-src 'self'", "connect-src 'self' ws:");

/**
 * Gives pages that are rendered per request a policy with a nonce of their own. Whatever policy a request brought along is
 * overwritten: Next would take its nonce from there.
 */
export function proxy(request: NextRequest) {
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64');
  const strict = noncePolicy(nonce, missingPage());
  const policy = process.env.NODE_ENV === 'development' ? loosened(strict) : strict;
  const headers = new Headers(request.headers);
  headers.set(HEADER, policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set(HEADER, policy);
  return response;
}

/** Only paths whose question is in the address, or which need a session: a match costs half a server's throughput. */
export const config = {
  matcher: [
    '/search',
    '/check',
    '/library',
    '/worksheets/:path+',
    '/desk/:path*',
    '/classes/:path*',
    '/administration/:path*',
    '/account/:path*',
    '/workshops/:path*',
  ],
};
