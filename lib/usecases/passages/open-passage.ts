import { findBoatSheet } from '@/db/read-models/boat-sheets';
import { findLatestCheck, type StoredCheck } from '@/db/read-models/passage-checks';
import { findPassageDraft, type PassageDraft } from '@/db/read-models/passage-draft';
import type { BoatRole } from '@/lib/access/permissions';
import { NotFoundError } from '@/lib/errors';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { Context } from '@/lib/usecases/context';
import { requirePassage } from '@/lib/usecases/passages/require-passage';

export interface OpenedPassage {
  readonly passage: PassageDraft;
  /** The newest that was stored; null where the passage was never saved. */
  readonly latestCheck: StoredCheck | null;
  /** With the newest version of her sheet. */
  readonly boat: {
    readonly id: string;
    readonly name: string;
    readonly sheetNumber: number;
    readonly sheet: BoatSheet;
  };
  readonly role: BoatRole;
  /** The stored check was made with an older version of the boat sheet than there is now. */
  readonly sheetIsNewer: boolean;
}

export async function openPassage(context: Context, passageId: string): Promise<OpenedPassage> {
  const { db } = context;
  const access = await requirePassage(context, passageId, 'read-passage');
  const passage = await findPassageDraft(db, passageId);
  const newest = await findBoatSheet(db, access.boatId);
  if (!passage || !newest) throw new NotFoundError('That passage');
  const latestCheck = await findLatestCheck(db, passageId);
  return {
    passage,
    latestCheck,
    boat: { id: access.boatId, name: access.boatName, sheetNumber: newest.number, sheet: newest.sheet },
    role: access.role,
    sheetIsNewer: latestCheck !== null && latestCheck.sheetNumber < newest.number,
  };
}
