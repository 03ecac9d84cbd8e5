import 'server-only';
import { cache } from 'react';
import { getToken } from 'next-auth/jwt';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { getDb } from '@/db/knex';
import { env } from '@/lib/env';
import { openSession } from '@/lib/usecases/accounts/open-session';
import { authenticateToken } from '@/lib/usecases/tokens/authenticate-token';

/** Set by proxy.ts on every page's request. */
const PATH_HEADER = 'x-twobow-path';

export interface CurrentUser {
  readonly id: string;
  readonly email: string;
  readonly name: string;
}

/**
 * The person behind a route's request: by personal token where one is sent, else by the session cookie.
 * Null where there is neither or it was revoked or ended.
 */
export async function currentUser(request: Request): Promise<CurrentUser | null> {
  const authorization = request.headers.get('authorization');
  if (authorization !== null) {
    const token = /^bearer\s+(\S+)$/i.exec(authorization)?.[1];
    return token ? authenticateToken(getDb(), token, new Date()) : null;
  }
  return sessionUser();
}

/** The person of the session cookie. Once a request: the frame and the page ask the same. */
export const sessionUser = cache(async (): Promise<CurrentUser | null> => {
  const jar = Object.fromEntries((await cookies()).getAll().map(({ name, value }) => [name, value]));
  const token = await getToken({
    req: { cookies: jar, headers: {} } as unknown as Parameters<typeof getToken>[0]['req'],
    secret: env().nextAuthSecret,
  });
  if (!token?.sub) return null;
  return openSession(getDb(), token.sub, token.sessionVersion ?? 0);
});

/**
 * For pages of signed-in people: goes to the sign-in page otherwise, and comes back to `returnTo` after it,
 * or to the page that was asked for (its path is told by proxy.ts).
 */
export async function requireUser(returnTo?: string): Promise<CurrentUser> {
  const user = await sessionUser();
  if (user) return user;
  const next = returnTo ?? (await headers()).get(PATH_HEADER);
  redirect(next ? `/sign-in?next=${encodeURIComponent(next)}` : '/sign-in');
}
