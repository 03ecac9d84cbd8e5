import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import type { BoatRole } from '@/lib/access/permissions';
import { insertBoatMember } from '@/db/stores/boat-store';
import { insertUser } from '@/db/stores/user-store';
import type { Context } from '@/lib/usecases/context';

/** A hash of nothing anybody knows; people of these tests do not sign in. */
const noPassword = `$argon2id$v=19$m=65536,t=3,p=1$${'A'.repeat(22)}$${'A'.repeat(43)}`;

export const testNow = new Date('2026-06-01T12:00:00Z');

/** A person of a fresh e-mail address, as the context in which they ask. */
export async function addPerson(db: Knex, name: string, now = testNow): Promise<Context> {
  const email = `${name.toLowerCase()}-${randomUUID()}@example.org`;
  const user = await insertUser(db, { email, name, passwordHash: noPassword });
  return { db, user: { id: user!.id, email, name }, now };
}

export async function addMember(db: Knex, boatId: string, name: string, role: BoatRole): Promise<Context> {
  const person = await addPerson(db, name);
  await insertBoatMember(db, boatId, person.user.id, role);
  return person;
}
