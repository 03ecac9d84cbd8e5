import type { Knex } from 'knex';

export async function insertToken(
  db: Knex,
  token: { userId: string; name: string; tokenHash: Buffer },
): Promise<{ id: string; createdAt: Date }> {
  const [row] = await db('personal_tokens')
    .insert({ user_id: token.userId, name: token.name, token_hash: token.tokenHash })
    .returning(['id', 'created_at']);
  return { id: row!.id, createdAt: row!.created_at };
}

/** True where the person has such a token and it was not revoked before. */
export async function revokeToken(db: Knex, userId: string, tokenId: string, now: Date): Promise<boolean> {
  const changed = await db('personal_tokens')
    .where({ id: tokenId, user_id: userId })
    .whereNull('revoked_at')
    .update({ revoked_at: now });
  return changed === 1;
}

/** The person behind a token that is not revoked; notes the use, at most once a minute. */
export async function recordTokenUse(
  db: Knex,
  tokenHash: Buffer,
  now: Date,
): Promise<{ id: string; email: string; name: string } | null> {
  const row = await db('personal_tokens')
    .join('users', 'users.id', 'personal_tokens.user_id')
    .where('personal_tokens.token_hash', tokenHash)
    .whereNull('personal_tokens.revoked_at')
    .first('users.id', 'users.email', 'users.name', 'personal_tokens.id as token_id', 'personal_tokens.last_used_at');
  if (!row) return null;
  if (!row.last_used_at || now.getTime() - row.last_used_at.getTime() > 60_000) {
    await db('personal_tokens').where({ id: row.token_id }).update({ last_used_at: now });
  }
  return { id: row.id, email: row.email, name: row.name };
}
