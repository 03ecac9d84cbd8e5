import { listPassageChecks as listStoredChecks, type StoredCheckLine } from '@/db/read-models/passage-checks';
import type { Context } from '@/lib/usecases/context';
import { requirePassage } from '@/lib/usecases/passages/require-passage';

/** The stored checks of a passage, newest first, each with the version of the boat sheet it was made with. */
export async function listPassageChecks(context: Context, passageId: string): Promise<readonly StoredCheckLine[]> {
  await requirePassage(context, passageId, 'read-passage');
  return listStoredChecks(context.db, passageId);
}
