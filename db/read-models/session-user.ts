import type { Knex } from 'knex';

export interface SessionUser {
  readonly id: string;
  readonly email: string;
  readonly name: string;
}

/** The person of a session, or null where it was ended by a newer password or "sign out everywhere". */
export async function findSessionUser(db: Knex, userId: string, sessionVersion: number): Promise<SessionUser | null> {
  const row = await db('users').where({ id: userId, session_version: sessionVersion }).first('id', 'email', 'name');
  return row ?? null;
}
