import type { Knex } from 'knex';
import { findSessionUser, type SessionUser } from '@/db/read-models/session-user';
import { isUuid } from '@/lib/usecases/is-uuid';

/** The person of a session cookie, or null where the session was ended. */
export async function openSession(db: Knex, userId: string, sessionVersion: number): Promise<SessionUser | null> {
  return isUuid(userId) ? findSessionUser(db, userId, sessionVersion) : null;
}
