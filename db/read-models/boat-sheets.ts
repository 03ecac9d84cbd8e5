import type { Knex } from 'knex';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';

export interface SheetVersion {
  readonly id: string;
  readonly number: number;
  readonly sheet: BoatSheet;
  readonly savedAt: Date;
  readonly savedBy: string;
}

export type SheetVersionLine = Omit<SheetVersion, 'sheet' | 'id'>;

/** One version of the boat's sheet, the newest where no number is given. */
export async function findBoatSheet(db: Knex, boatId: string, number?: number): Promise<SheetVersion | null> {
  const query = db('boat_sheets')
    .join('users', 'users.id', 'boat_sheets.saved_by')
    .where({ boat_id: boatId })
    .orderBy('number', 'desc');
  if (number !== undefined) query.where({ number });
  const row = await query.first(
    'boat_sheets.id',
    'boat_sheets.number',
    'boat_sheets.sheet',
    'boat_sheets.created_at',
    'users.name as saved_by_name',
  );
  if (!row) return null;
  return { id: row.id, number: row.number, sheet: row.sheet, savedAt: row.created_at, savedBy: row.saved_by_name };
}

/** All versions without their content, newest first. */
export async function listBoatSheets(db: Knex, boatId: string): Promise<readonly SheetVersionLine[]> {
  const rows = await db('boat_sheets')
    .join('users', 'users.id', 'boat_sheets.saved_by')
    .where({ boat_id: boatId })
    .orderBy('number', 'desc')
    .select('boat_sheets.number', 'boat_sheets.created_at', 'users.name as saved_by_name');
  return rows.map((row) => ({ number: row.number, savedAt: row.created_at, savedBy: row.saved_by_name }));
}
