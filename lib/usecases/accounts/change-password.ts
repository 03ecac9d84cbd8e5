import { insertAuditEvent } from '@/db/stores/audit-store';
import { findCredentialsById, updatePassword } from '@/db/stores/user-store';
import { passwordProblem } from '@/lib/access/password-rule';
import { InvalidInputError, NotSignedInError } from '@/lib/errors';
import { passwordChangedMail } from '@/lib/usecases/accounts/mails';
import { hashPassword, verifyPassword } from '@/lib/usecases/accounts/password-hashing';
import { throttle } from '@/lib/usecases/accounts/throttle';
import { throttleRules } from '@/lib/usecases/accounts/throttle-rules';
import type { Context, MailSender } from '@/lib/usecases/context';

/** Sets a new password for who knows the present one, and ends every session, also this one. */
export async function changePassword(
  context: Context & { readonly mail: MailSender; readonly origin: string },
  { currentPassword, newPassword }: { currentPassword: string; newPassword: string },
): Promise<void> {
  const { db, user } = context;
  const problem = passwordProblem(newPassword, user.email);
  if (problem) throw new InvalidInputError([{ pointer: '/newPassword', message: problem }], 422);
  await throttle(db, throttleRules.passwordOfUser, user.id);
  const found = await findCredentialsById(db, user.id);
  if (!found) throw new NotSignedInError();
  if (!(await verifyPassword(found.passwordHash, currentPassword))) {
    const message = 'Present password: this is not it. Nothing was changed.';
    throw new InvalidInputError([{ pointer: '/currentPassword', message }], 422);
  }
  const passwordHash = await hashPassword(newPassword);
  await db.transaction(async (trx) => {
    await updatePassword(trx, user.id, passwordHash);
    await insertAuditEvent(trx, { userId: user.id, action: 'change-password' });
  });
  await context.mail.send(passwordChangedMail(user, context.origin));
}
