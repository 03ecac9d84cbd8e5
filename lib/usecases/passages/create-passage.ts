import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertPassage } from '@/db/stores/passage-store';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

const HOUR_MS = 3_600_000;

/** Makes an empty passage of the boat, departing at the next full hour until a time is chosen. */
export async function createPassage(
  context: Context,
  boatId: string,
  { name, zone = 'UTC' }: { name: string; zone?: string },
): Promise<{ id: string }> {
  const { user, now } = context;
  await requireBoat(context, boatId, 'write-passage');
  const departure = new Date((Math.floor(now.getTime() / HOUR_MS) + 1) * HOUR_MS);
  return context.db.transaction(async (trx) => {
    const { id } = await insertPassage(trx, { boatId, name, zone, departure, createdBy: user.id });
    await insertAuditEvent(trx, { userId: user.id, action: 'create-passage', subjectId: id });
    return { id };
  });
}
