import { insertAuditEvent } from '@/db/stores/audit-store';
import { hidePassage as hideStoredPassage } from '@/db/stores/passage-store';
import type { Context } from '@/lib/usecases/context';
import { requirePassage } from '@/lib/usecases/passages/require-passage';

/** Takes a passage out of sight of everybody. Can be undone for 30 days. */
export async function hidePassage(context: Context, passageId: string): Promise<void> {
  const { user, now } = context;
  await requirePassage(context, passageId, 'hide-passage');
  await context.db.transaction(async (trx) => {
    await hideStoredPassage(trx, passageId, user.id, now);
    await insertAuditEvent(trx, { userId: user.id, action: 'hide-passage', subjectId: passageId });
  });
}
