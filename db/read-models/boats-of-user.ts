import type { Knex } from 'knex';
import type { BoatRole } from '@/lib/access/permissions';

export interface BoatLine {
  readonly id: string;
  readonly name: string;
  readonly role: BoatRole;
  readonly sheetNumber: number;
  readonly sheetSavedAt: Date;
  readonly hiddenAt: Date | null;
}

/** The boats a person has a role on, by name; hidden ones only where they can still be brought back. */
export async function listBoatsOfUser(
  db: Knex,
  userId: string,
  which: { hidden: false } | { hidden: true; since: Date },
): Promise<readonly BoatLine[]> {
  const query = db('boats')
    .join('boat_members', 'boat_members.boat_id', 'boats.id')
    .joinRaw(
      `JOIN LATERAL (SELECT number, created_at FROM boat_sheets WHERE boat_id = boats.id
         ORDER BY number DESC LIMIT 1) newest ON true`,
    )
    .where('boat_members.user_id', userId)
    .orderBy('boats.name')
    .select(
      'boats.id',
      'boats.name',
      'boats.hidden_at',
      'boat_members.role',
      'newest.number as sheet_number',
      'newest.created_at as sheet_saved_at',
    );
  if (which.hidden) query.where('boats.hidden_at', '>', which.since);
  else query.whereNull('boats.hidden_at');
  const rows = await query;
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    role: row.role,
    sheetNumber: row.sheet_number,
    sheetSavedAt: row.sheet_saved_at,
    hiddenAt: row.hidden_at,
  }));
}
