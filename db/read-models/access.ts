import type { Knex } from 'knex';
import type { BoatRole } from '@/lib/access/permissions';

export interface BoatAccess {
  readonly boatId: string;
  readonly boatName: string;
  readonly role: BoatRole;
  readonly hiddenAt: Date | null;
}

export interface PassageAccess extends BoatAccess {
  readonly passageId: string;
  readonly passageHiddenAt: Date | null;
}

/** The person's role on the boat; null where she is unknown or foreign. */
export async function findBoatAccess(db: Knex, userId: string, boatId: string): Promise<BoatAccess | null> {
  const row = await db('boats')
    .join('boat_members', 'boat_members.boat_id', 'boats.id')
    .where('boats.id', boatId)
    .where('boat_members.user_id', userId)
    .first('boats.name', 'boats.hidden_at', 'boat_members.role');
  return row ? { boatId, boatName: row.name, role: row.role, hiddenAt: row.hidden_at } : null;
}

/** The person's role on the passage's boat; null where the passage is unknown or foreign. */
export async function findPassageAccess(db: Knex, userId: string, passageId: string): Promise<PassageAccess | null> {
  const row = await db('passages')
    .join('boats', 'boats.id', 'passages.boat_id')
    .join('boat_members', 'boat_members.boat_id', 'boats.id')
    .where('passages.id', passageId)
    .where('boat_members.user_id', userId)
    .first(
      'boats.id as boat_id',
      'boats.name as boat_name',
      'boats.hidden_at',
      'boat_members.role',
      'passages.hidden_at as passage_hidden_at',
    );
  if (!row) return null;
  return {
    boatId: row.boat_id,
    boatName: row.boat_name,
    role: row.role,
    hiddenAt: row.hidden_at,
    passageId,
    passageHiddenAt: row.passage_hidden_at,
  };
}
