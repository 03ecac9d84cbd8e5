import type { Knex } from 'knex';
import type { UserRow } from '@/db/tables';
import { isUniqueViolation } from '@/db/is-unique-violation';

export interface Credentials {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly passwordHash: string;
  readonly sessionVersion: number;
}

/** Adds a person. Null where the e-mail, in any case of letters, is taken. */
export async function insertUser(
  db: Knex,
  user: { email: string; name: string; passwordHash: string },
): Promise<{ id: string } | null> {
  try {
    const [row] = await db('users')
      .insert({ email: user.email, name: user.name, password_hash: user.passwordHash })
      .returning('id');
    return row ?? null;
  } catch (error) {
    if (isUniqueViolation(error, 'users_email_unique')) return null;
    throw error;
  }
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
