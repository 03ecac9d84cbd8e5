import { listPassagesOfUser, type PassageLine } from '@/db/read-models/passages-of-user';
import type { Context } from '@/lib/usecases/context';
import { isUuid } from '@/lib/usecases/is-uuid';
import { undoSince } from '@/lib/usecases/undo-days';

/** The passages of the person's boats, or of one of them, and those hidden that can still be brought back. */
export async function listPassages(
  { db, user, now }: Context,
  { boatId }: { boatId?: string } = {},
): Promise<{ passages: readonly PassageLine[]; hidden: readonly PassageLine[] }> {
  if (boatId !== undefined && !isUuid(boatId)) return { passages: [], hidden: [] };
  const ofBoat = boatId === undefined ? {} : { boatId };
  const passages = await listPassagesOfUser(db, user.id, { ...ofBoat, which: { hidden: false } });
  const hidden = await listPassagesOfUser(db, user.id, { ...ofBoat, which: { hidden: true, since: undoSince(now) } });
  return { passages, hidden };
}
