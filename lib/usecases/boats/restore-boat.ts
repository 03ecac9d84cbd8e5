import { insertAuditEvent } from '@/db/stores/audit-store';
import { showBoat } from '@/db/stores/boat-store';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

/** Brings a hidden boat back, within 30 days. */
export async function restoreBoat(context: Context, boatId: string): Promise<void> {
  await requireBoat(context, boatId, 'hide-boat', { presence: 'hidden' });
  await context.db.transaction(async (trx) => {
    await showBoat(trx, boatId);
    await insertAuditEvent(trx, { userId: context.user.id, action: 'restore-boat', subjectId: boatId });
  });
}
