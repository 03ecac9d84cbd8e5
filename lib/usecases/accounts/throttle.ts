import { createHash } from 'node:crypto';
import type { Knex } from 'knex';
import { countTry, type ThrottleRule } from '@/db/stores/throttle-store';
import { TooManyTriesError } from '@/lib/errors';

/** Counts a try. Throws TooManyTriesError where there were too many. */
export async function throttle(db: Knex, rule: ThrottleRule, key: string): Promise<void> {
  const waitSeconds = await countTry(db, rule, key);
  if (waitSeconds !== null) throw new TooManyTriesError(waitSeconds);
}

/** The key of an account: the same for an e-mail that nobody has, and without telling the e-mail. */
export function accountKey(email: string): string {
  return createHash('sha256').update(email.trim().toLowerCase()).digest('hex');
}
