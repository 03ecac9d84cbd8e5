import type { Knex } from 'knex';
import type { SessionUser } from '@/db/read-models/session-user';
import { recordTokenUse } from '@/db/stores/token-store';
import { hashSecretToken } from '@/lib/usecases/secret-token';

/** The person of a personal token, or null where it is unknown or revoked. */
export async function authenticateToken(db: Knex, token: string, now: Date): Promise<SessionUser | null> {
  return /^twobow_[\w-]{43}$/.test(token) ? recordTokenUse(db, hashSecretToken(token), now) : null;
}
