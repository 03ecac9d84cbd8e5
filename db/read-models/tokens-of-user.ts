import type { Knex } from 'knex';

export interface TokenLine {
  readonly id: string;
  readonly name: string;
  readonly createdAt: Date;
  readonly lastUsedAt: Date | null;
  readonly revokedAt: Date | null;
}

/** The person's tokens, newest first; never their hashes. */
export async function listTokensOfUser(db: Knex, userId: string): Promise<readonly TokenLine[]> {
  const rows = await db('personal_tokens')
    .where({ user_id: userId })
    .orderBy('created_at', 'desc')
    .select('id', 'name', 'created_at', 'last_used_at', 'revoked_at');
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    createdAt: row.created_at,
    lastUsedAt: row.last_used_at,
    revokedAt: row.revoked_at,
  }));
}

/** How many of the person's tokens are not revoked. */
export async function countLiveTokens(db: Knex, userId: string): Promise<number> {
  const row = await db('personal_tokens')
    .where({ user_id: userId })
    .whereNull('revoked_at')
    .count<{ count: string }>({ count: '*' })
    .first();
  return Number(row?.count ?? 0);
}
