import { findPassageAccess, type PassageAccess } from '@/db/read-models/access';
import { can } from '@/lib/access/can';
import type { Action } from '@/lib/access/permissions';
import { NotAllowedError, NotFoundError } from '@/lib/errors';
import { isPresent, type Presence } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';
import { isUuid } from '@/lib/usecases/is-uuid';

/** The person's access to a passage, by the role on her boat; throws as requireBoat does. */
export async function requirePassage(
  context: Context,
  passageId: string,
  action: Action,
  presence: Presence = 'in-use',
): Promise<PassageAccess> {
  const access = isUuid(passageId) ? await findPassageAccess(context.db, context.user.id, passageId) : null;
  if (!access || access.hiddenAt !== null || !isPresent(access.passageHiddenAt, presence, context.now)) {
    throw new NotFoundError('That passage');
  }
  if (!can(access.role, action)) throw new NotAllowedError();
  return access;
}
