import type { Knex } from 'knex';
import type { UserRow } from '@/db/tables';

export interface Credentials {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  /** Null until a password was chosen by a mailed link: nobody can sign in before. */
  readonly passwordHash: string | null;
  readonly sessionVersion: number;
}

/** Adds a person. Null where the e-mail, in any case of letters, is taken; a transaction lives on all the same. */
export async function insertUser(
  db: Knex,
  user: { email: string; name: string; passwordHash: string | null },
): Promise<{ id: string } | null> {
  const [row] = await db('users')
    .insert({ email: user.email, name: user.name, password_hash: user.passwordHash })
    .onConflict()
    .ignore()
    .returning('id');
  return row ?? null;
}

export async function findCredentialsByEmail(db: Knex, email: string): Promise<Credentials | null> {
  return toCredentials(await db('users').whereRaw('lower(email) = lower(?)', [email]).first());
}

export async function findCredentialsById(db: Knex, userId: string): Promise<Credentials | null> {
  return toCredentials(await db('users').where({ id: userId }).first());
}

export async function updateUserName(db: Knex, userId: string, name: string): Promise<void> {
  await db('users').where({ id: userId }).update({ name, updated_at: db.fn.now() });
}

/** A new password ends every session: the version in each cookie no longer matches. */
export async function updatePassword(db: Knex, userId: string, passwordHash: string): Promise<number> {
  const [row] = await db('users')
    .where({ id: userId })
    .update({
      password_hash: passwordHash,
      session_version: db.raw('session_version + 1') as unknown as number,
      updated_at: db.fn.now() as unknown as Date,
    })
    .returning('session_version');
  return row?.session_version ?? 0;
}

export async function raiseSessionVersion(db: Knex, userId: string): Promise<void> {
  await db('users').where({ id: userId }).increment('session_version', 1);
}

function toCredentials(row: UserRow | undefined): Credentials | null {
  if (!row) return null;
  return {
    id: row.id,
    email: row.email,
    name: row.name,
    passwordHash: row.password_hash,
    sessionVersion: row.session_version,
  };
}
