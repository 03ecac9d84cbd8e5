import { insertAuditEvent } from '@/db/stores/audit-store';
import { findPasswordReset, takePasswordReset } from '@/db/stores/password-reset-store';
import { updatePassword } from '@/db/stores/user-store';
import { passwordProblem } from '@/lib/access/password-rule';
import { InvalidInputError } from '@/lib/errors';
import { passwordChangedMail } from '@/lib/usecases/accounts/mails';
import { hashPassword } from '@/lib/usecases/accounts/password-hashing';
import type { VisitorContext } from '@/lib/usecases/context';
import { hashSecretToken } from '@/lib/usecases/secret-token';

const deadLink = 'This link was used already, has expired or is not whole. Ask for a new one.';

/** Sets a new password by a mailed link, which works once, and ends every session. */
export async function resetPassword(
  context: VisitorContext,
  { token, password }: { token: string; password: string },
): Promise<void> {
  const tokenHash = hashSecretToken(token);
  const link = await findPasswordReset(context.db, tokenHash, context.now);
  if (!link) throw new InvalidInputError([{ pointer: '/token', message: deadLink }], 422);
  const problem = passwordProblem(password, link.email);
  if (problem) throw new InvalidInputError([{ pointer: '/password', message: problem }], 422);
  const passwordHash = await hashPassword(password);
  await context.db.transaction(async (trx) => {
    const taken = await takePasswordReset(trx, tokenHash, context.now);
    if (!taken) throw new InvalidInputError([{ pointer: '/token', message: deadLink }], 422);
    await updatePassword(trx, taken.userId, passwordHash);
    await insertAuditEvent(trx, { userId: taken.userId, action: 'reset-password' });
  });
  await context.mail.send(passwordChangedMail(link, context.origin));
}
