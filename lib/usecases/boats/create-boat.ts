import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertBoatSheet } from '@/db/stores/boat-sheet-store';
import { insertBoat, insertBoatMember } from '@/db/stores/boat-store';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { Context } from '@/lib/usecases/context';

/** Makes a boat with version 1 of her sheet; who makes her owns her. */
export async function createBoat({ db, user }: Context, name: string, sheet: BoatSheet): Promise<{ id: string }> {
  return db.transaction(async (trx) => {
    const { id } = await insertBoat(trx, name);
    await insertBoatMember(trx, id, user.id, 'owner');
    await insertBoatSheet(trx, { boatId: id, number: 1, sheet, savedBy: user.id });
    await insertAuditEvent(trx, { userId: user.id, action: 'create-boat', subjectId: id });
    return { id };
  });
}
