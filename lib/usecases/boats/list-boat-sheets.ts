import { listBoatSheets as listStoredSheets, type SheetVersionLine } from '@/db/read-models/boat-sheets';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

/** The versions of the boat's sheet, newest first. */
export async function listBoatSheets(context: Context, boatId: string): Promise<readonly SheetVersionLine[]> {
  await requireBoat(context, boatId, 'read-boat');
  return listStoredSheets(context.db, boatId);
}
