import { insertAuditEvent } from '@/db/stores/audit-store';
import { revokeToken as revokeStoredToken } from '@/db/stores/token-store';
import { NotFoundError } from '@/lib/errors';
import type { Context } from '@/lib/usecases/context';
import { isUuid } from '@/lib/usecases/is-uuid';

/** Ends a token of the person's own for good. Somebody else's is not found. */
export async function revokeToken({ db, user, now }: Context, tokenId: string): Promise<void> {
  if (!isUuid(tokenId)) throw new NotFoundError('That token');
  await db.transaction(async (trx) => {
    if (!(await revokeStoredToken(trx, user.id, tokenId, now))) throw new NotFoundError('That token');
    await insertAuditEvent(trx, { userId: user.id, action: 'revoke-token', subjectId: tokenId });
  });
}
