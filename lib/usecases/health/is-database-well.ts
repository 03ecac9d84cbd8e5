import type { Knex } from 'knex';

/** Whether the database answers within `patienceMs` and has the tables it should have. Never throws. */
export async function isDatabaseWell(db: Knex, patienceMs = 3000): Promise<boolean> {
  try {
    await db('users').select(db.raw('1')).limit(1).timeout(patienceMs);
    return true;
  } catch {
    return false;
  }
}
