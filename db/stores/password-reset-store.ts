import type { Knex } from 'knex';

/** Adds a link to reset with; earlier links of the person that were not used stop working. */
export async function insertPasswordReset(
  db: Knex,
  reset: { userId: string; tokenHash: Buffer; now: Date; expiresAt: Date },
): Promise<void> {
  await db('password_resets').where({ user_id: reset.userId }).whereNull('used_at').update({ used_at: reset.now });
  await db('password_resets').insert({
    user_id: reset.userId,
    token_hash: reset.tokenHash,
    created_at: reset.now,
    expires_at: reset.expiresAt,
  });
}

/** Uses up a link that is neither used nor expired, in one statement, so that it works once. */
export async function takePasswordReset(db: Knex, tokenHash: Buffer, now: Date): Promise<{ userId: string } | null> {
  const [row] = await db('password_resets')
    .where({ token_hash: tokenHash })
    .whereNull('used_at')
    .where('expires_at', '>', now)
    .update({ used_at: now })
    .returning('user_id');
  return row ? { userId: row.user_id } : null;
}

/** Whose link it is, without using it up. */
export async function findPasswordReset(db: Knex, tokenHash: Buffer, now: Date): Promise<{ email: string } | null> {
  const row = await db('password_resets')
    .join('users', 'users.id', 'password_resets.user_id')
    .where('password_resets.token_hash', tokenHash)
    .whereNull('password_resets.used_at')
    .where('password_resets.expires_at', '>', now)
    .first('users.email');
  return row ?? null;
}
