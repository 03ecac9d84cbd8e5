import 'server-only';
import { headers } from 'next/headers';
import { getDb } from '@/db/knex';
import { env } from '@/lib/env';
import type { Context, MailSender, VisitorContext } from '@/lib/usecases/context';
import { clientAddress } from '@/lib/web/client-address';
import { mailSender } from '@/lib/web/mail';
import { type CurrentUser, requireUser } from '@/lib/web/session';

/** What a use case needs in a page or action of a signed-in person. */
export async function pageContext(returnTo?: string): Promise<Context> {
  return contextOf(await requireUser(returnTo));
}

/** The same in a route, whose guard has found the person. */
export function contextOf(user: CurrentUser): Context {
  return { db: getDb(), user, now: new Date() };
}

/** The same where mail may be sent. */
export async function mailingContext(returnTo?: string): Promise<Context & { mail: MailSender; origin: string }> {
  return { ...(await pageContext(returnTo)), mail: mailSender, origin: ownOrigin() };
}

/** Of somebody who is not signed in. */
export async function visitorContext(): Promise<VisitorContext> {
  const address = clientAddress(await headers());
  return { db: getDb(), now: new Date(), address, mail: mailSender, origin: ownOrigin() };
}

function ownOrigin(): string {
  return new URL(env().nextAuthUrl).origin;
}
