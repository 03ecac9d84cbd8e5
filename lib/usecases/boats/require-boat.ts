import type { Knex } from 'knex';
import { type BoatAccess, findBoatAccess } from '@/db/read-models/access';
import { can } from '@/lib/access/can';
import type { Action } from '@/lib/access/permissions';
import { NotAllowedError, NotFoundError } from '@/lib/errors';
import type { Context } from '@/lib/usecases/context';
import { isUuid } from '@/lib/usecases/is-uuid';
import { undoSince } from '@/lib/usecases/undo-days';

/** Whether a boat that is in use is meant, or one hidden so short ago that it can be brought back. */
export type Presence = 'in-use' | 'hidden';

/**
 * The person's access to a boat. Throws NotFoundError where she is unknown, foreign or not in the wanted
 * presence, NotAllowedError where the role does not allow the action.
 */
export async function requireBoat(
  context: Context,
  boatId: string,
  action: Action,
  { presence = 'in-use', db = context.db }: { presence?: Presence; db?: Knex } = {},
): Promise<BoatAccess> {
  const access = isUuid(boatId) ? await findBoatAccess(db, context.user.id, boatId) : null;
  if (!access || !isPresent(access.hiddenAt, presence, context.now)) throw new NotFoundError('That boat');
  if (!can(access.role, action)) throw new NotAllowedError();
  return access;
}

export function isPresent(hiddenAt: Date | null, presence: Presence, now: Date): boolean {
  return presence === 'in-use' ? hiddenAt === null : hiddenAt !== null && hiddenAt > undoSince(now);
}
