import { findBoatSheet } from '@/db/read-models/boat-sheets';
import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertBoatSheet } from '@/db/stores/boat-sheet-store';
import { lockBoat } from '@/db/stores/boat-store';
import { ConflictError } from '@/lib/errors';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

/**
 * Saves a new numbered version. Throws ConflictError where somebody saved one since the version it is
 * based on; nothing is lost, the other version stays.
 */
export async function saveBoatSheet(
  context: Context,
  boatId: string,
  sheet: BoatSheet,
  basedOnNumber: number,
): Promise<{ number: number }> {
  const { user } = context;
  await requireBoat(context, boatId, 'write-boat-sheet');
  return context.db.transaction(async (trx) => {
    await lockBoat(trx, boatId);
    const newest = await findBoatSheet(trx, boatId);
    if (!newest || newest.number !== basedOnNumber) {
      throw new ConflictError(
        `${newest?.savedBy ?? 'Somebody'} saved version ${newest?.number ?? '?'} of this boat sheet meanwhile; yours is based on version ${basedOnNumber}. Open the newest version and put your changes in again.`,
      );
    }
    const number = newest.number + 1;
    await insertBoatSheet(trx, { boatId, number, sheet, savedBy: user.id });
    await insertAuditEvent(trx, { userId: user.id, action: 'save-boat-sheet', subjectId: boatId, details: { number } });
    return { number };
  });
}
