import { type BoatLine, listBoatsOfUser } from '@/db/read-models/boats-of-user';
import type { Context } from '@/lib/usecases/context';
import { undoSince } from '@/lib/usecases/undo-days';

/** The boats the person has a role on, and those hidden that can still be brought back. */
export async function listBoats({ db, user, now }: Context): Promise<{
  boats: readonly BoatLine[];
  hidden: readonly BoatLine[];
}> {
  const boats = await listBoatsOfUser(db, user.id, { hidden: false });
  const hidden = await listBoatsOfUser(db, user.id, { hidden: true, since: undoSince(now) });
  return { boats, hidden };
}
