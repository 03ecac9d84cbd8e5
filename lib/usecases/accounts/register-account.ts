import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertPasswordReset } from '@/db/stores/password-reset-store';
import { countTry } from '@/db/stores/throttle-store';
import { findCredentialsByEmail, insertUser } from '@/db/stores/user-store';
import { accountExistsMail, WELCOME_HOURS, welcomeMail } from '@/lib/usecases/accounts/mails';
import { accountKey, throttle } from '@/lib/usecases/accounts/throttle';
import { throttleRules } from '@/lib/usecases/accounts/throttle-rules';
import type { VisitorContext } from '@/lib/usecases/context';
import { newSecretToken } from '@/lib/usecases/secret-token';

/**
 * Makes an account whose password is chosen by a mailed link, or tells the holder of an existing one by mail that
 * somebody tried. The caller learns nothing of which it was, then or later: one mail either way, the same answer, and
 * nobody signs in to an address whose mail they cannot read.
 */
export async function registerAccount(
  context: VisitorContext,
  account: { email: string; name: string },
): Promise<void> {
  const { db, now, origin } = context;
  await throttle(db, throttleRules.registerFromAddress, context.address);
  const mailsTooMany = await countTry(db, throttleRules.mailToAccount, accountKey(account.email));
  const { token, tokenHash } = newSecretToken();
  const expiresAt = new Date(now.getTime() + WELCOME_HOURS * 3_600_000);
  const isWaiting = await db.transaction(async (trx) => {
    const added = await insertUser(trx, { ...account, passwordHash: null });
    const user = await findCredentialsByEmail(trx, account.email);
    await insertAuditEvent(trx, { userId: added?.id ?? null, action: 'register-account' });
    if (!user || user.passwordHash !== null || mailsTooMany !== null) return false;
    await insertPasswordReset(trx, { userId: user.id, tokenHash, now, expiresAt });
    return true;
  });
  if (mailsTooMany !== null) return;
  const { email } = account;
  await context.mail.send(isWaiting ? welcomeMail({ email, token }, origin) : accountExistsMail({ email }, origin));
}
