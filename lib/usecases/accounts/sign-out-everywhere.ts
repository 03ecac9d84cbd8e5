import { insertAuditEvent } from '@/db/stores/audit-store';
import { raiseSessionVersion } from '@/db/stores/user-store';
import type { Context } from '@/lib/usecases/context';

/** Ends every session of the person, on every device. Personal tokens stay; they are revoked one by one. */
export async function signOutEverywhere({ db, user }: Context): Promise<void> {
  await db.transaction(async (trx) => {
    await raiseSessionVersion(trx, user.id);
    await insertAuditEvent(trx, { userId: user.id, action: 'sign-out-everywhere' });
  });
}
