import type { Knex } from 'knex';
import type { BoatRole } from '@/lib/access/permissions';

export async function insertBoat(db: Knex, name: string): Promise<{ id: string }> {
  const [row] = await db('boats').insert({ name }).returning('id');
  return row!;
}

export async function updateBoatName(db: Knex, boatId: string, name: string): Promise<void> {
  await db('boats').where({ id: boatId }).update({ name, updated_at: db.fn.now() });
}

export async function hideBoat(db: Knex, boatId: string, userId: string, now: Date): Promise<void> {
  await db('boats').where({ id: boatId }).update({ hidden_at: now, hidden_by: userId });
}

export async function showBoat(db: Knex, boatId: string): Promise<void> {
  await db('boats').where({ id: boatId }).update({ hidden_at: null, hidden_by: null });
}

/** Holds the boat's row to the end of the transaction, so that two saves come one after the other. */
export async function lockBoat(trx: Knex, boatId: string): Promise<void> {
  await trx('boats').where({ id: boatId }).forUpdate().first('id');
}

export async function insertBoatMember(db: Knex, boatId: string, userId: string, role: BoatRole): Promise<void> {
  await db('boat_members').insert({ boat_id: boatId, user_id: userId, role });
}
