import { insertAuditEvent } from '@/db/stores/audit-store';
import { updateBoatName } from '@/db/stores/boat-store';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

export async function renameBoat(context: Context, boatId: string, name: string): Promise<void> {
  const { boatName } = await requireBoat(context, boatId, 'rename-boat');
  await context.db.transaction(async (trx) => {
    await updateBoatName(trx, boatId, name);
    const details = { from: boatName, to: name };
    await insertAuditEvent(trx, { userId: context.user.id, action: 'rename-boat', subjectId: boatId, details });
  });
}
