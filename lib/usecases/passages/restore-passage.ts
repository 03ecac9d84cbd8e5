import { insertAuditEvent } from '@/db/stores/audit-store';
import { showPassage } from '@/db/stores/passage-store';
import type { Context } from '@/lib/usecases/context';
import { requirePassage } from '@/lib/usecases/passages/require-passage';

/** Brings a hidden passage back, within 30 days. */
export async function restorePassage(context: Context, passageId: string): Promise<void> {
  await requirePassage(context, passageId, 'hide-passage', 'hidden');
  await context.db.transaction(async (trx) => {
    await showPassage(trx, passageId);
    await insertAuditEvent(trx, { userId: context.user.id, action: 'restore-passage', subjectId: passageId });
  });
}
