import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertPasswordReset } from '@/db/stores/password-reset-store';
import { findCredentialsByEmail } from '@/db/stores/user-store';
import { resetMail, RESET_MINUTES } from '@/lib/usecases/accounts/mails';
import { accountKey, throttle } from '@/lib/usecases/accounts/throttle';
import { throttleRules } from '@/lib/usecases/accounts/throttle-rules';
import type { VisitorContext } from '@/lib/usecases/context';
import { newSecretToken } from '@/lib/usecases/secret-token';

/** Sends a link to set a new password with, where the address has an account. The answer is always the same. */
export async function requestPasswordReset(context: VisitorContext, email: string): Promise<void> {
  await throttle(context.db, throttleRules.resetFromAddress, context.address);
  await throttle(context.db, throttleRules.mailToAccount, accountKey(email));
  const { token, tokenHash } = newSecretToken();
  const user = await findCredentialsByEmail(context.db, email);
  await insertAuditEvent(context.db, { userId: user?.id ?? null, action: 'request-password-reset' });
  if (!user) return;
  const expiresAt = new Date(context.now.getTime() + RESET_MINUTES * 60_000);
  await context.db.transaction((trx) =>
    insertPasswordReset(trx, { userId: user.id, tokenHash, now: context.now, expiresAt }),
  );
  await context.mail.send(resetMail({ email: user.email, token }, context.origin));
}
