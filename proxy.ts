import { NextResponse, type NextRequest } from 'next/server';
import { env } from '@/lib/env';
import { contentSecurityPolicy } from '@/lib/web/content-security-policy';

/**
 * Gives each page a content security policy with a nonce of its own. The request carries it too: the
 * framework reads the nonce there and puts it on its scripts. Pages therefore are made for each request.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(18))).toString('base64');
  const policy = contentSecurityPolicy(nonce, env().nodeEnv === 'development');
  const headers = new Headers(request.headers);
  headers.set('content-security-policy', policy);
  headers.set('x-nonce', nonce);
  headers.set('x-twobow-path', request.nextUrl.pathname + request.nextUrl.search);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  return response;
}

export const config = {
  // Pages only: routes under /api carry a policy of their own and read large bodies themselves; files need none.
  matcher: ['/((?!api/|_next/static|_next/image|tiles-sample/|fonts/|favicon.ico|icon.svg|maplibre-gl-worker.mjs).*)'],
};
