import { insertAuditEvent } from '@/db/stores/audit-store';
import { hideBoat as hideStoredBoat } from '@/db/stores/boat-store';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

/** Takes a boat and her passages out of sight of everybody. Can be undone for 30 days. */
export async function hideBoat(context: Context, boatId: string): Promise<void> {
  const { user, now } = context;
  await requireBoat(context, boatId, 'hide-boat');
  await context.db.transaction(async (trx) => {
    await hideStoredBoat(trx, boatId, user.id, now);
    await insertAuditEvent(trx, { userId: user.id, action: 'hide-boat', subjectId: boatId });
  });
}
