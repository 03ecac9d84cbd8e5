import 'server-only';
import type { NextAuthOptions, Session } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { getDb } from '@/db/knex';
import { env } from '@/lib/env';
import { TooManyTriesError } from '@/lib/errors';
import { signInSchema } from '@/lib/schemas/account';
import { openSession } from '@/lib/usecases/accounts/open-session';
import { signIn } from '@/lib/usecases/accounts/sign-in';
import { clientAddress } from '@/lib/web/client-address';
import { log } from '@/lib/web/log';

const THIRTY_DAYS_S = 30 * 24 * 3600;

/** Sessions are signed cookies, httpOnly and SameSite=Lax by next-auth's default, Secure under https. */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().nextAuthSecret,
    session: { strategy: 'jwt', maxAge: THIRTY_DAYS_S },
    pages: { signIn: '/sign-in', signOut: '/account', error: '/sign-in' },
    logger: { error: (code, metadata) => log.warn({ code, metadata }, 'next-auth'), warn: () => {}, debug: () => {} },
    providers: [
      CredentialsProvider({
        name: 'E-mail and password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: (credentials, request) => authorize(credentials, new Headers(request.headers as HeadersInit)),
      }),
    ],
    callbacks: {
      jwt({ token, user }) {
        if (user) return { sub: user.id, sessionVersion: user.sessionVersion };
        return token;
      },
      async session({ session, token }) {
        const user = await openSession(getDb(), token.sub ?? '', token.sessionVersion ?? 0);
        return user ? { expires: session.expires, user } : ({} as Session);
      },
    },
  };
}

/** The error's text reaches the sign-in page, which knows "too-many-tries" and the seconds behind it. */
async function authorize(credentials: unknown, headers: Headers) {
  const parsed = signInSchema.safeParse(credentials);
  if (!parsed.success) return null;
  try {
    return await signIn({ db: getDb(), address: clientAddress(headers) }, parsed.data);
  } catch (error) {
    if (error instanceof TooManyTriesError) throw new Error(`too-many-tries:${error.retryAfterSeconds}`);
    log.error({ err: error }, 'sign-in failed');
    throw new Error('fault');
  }
}
