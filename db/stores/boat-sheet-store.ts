import type { Knex } from 'knex';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { toJsonb } from '@/db/json';

/** Raised when the shape of a stored sheet changes; older ones are read by the version they carry. */
const SHEET_SCHEMA_VERSION = 1;

export async function insertBoatSheet(
  db: Knex,
  version: { boatId: string; number: number; sheet: BoatSheet; savedBy: string },
): Promise<{ id: string }> {
  const [row] = await db('boat_sheets')
    .insert({
      boat_id: version.boatId,
      number: version.number,
      schema_version: SHEET_SCHEMA_VERSION,
      sheet: toJsonb(version.sheet),
      saved_by: version.savedBy,
    })
    .returning('id');
  return row!;
}
