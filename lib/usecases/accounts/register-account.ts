import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertUser } from '@/db/stores/user-store';
import { countTry } from '@/db/stores/throttle-store';
import { passwordProblem } from '@/lib/access/password-rule';
import { InvalidInputError } from '@/lib/errors';
import { accountExistsMail, welcomeMail } from '@/lib/usecases/accounts/mails';
import { hashPassword } from '@/lib/usecases/accounts/password-hashing';
import { accountKey, throttle } from '@/lib/usecases/accounts/throttle';
import { throttleRules } from '@/lib/usecases/accounts/throttle-rules';
import type { VisitorContext } from '@/lib/usecases/context';

/**
 * Makes an account, or tells the holder of an existing one by mail that somebody tried. The caller learns
 * nothing of which it was: same work, one mail either way, same answer.
 */
export async function registerAccount(
  context: VisitorContext,
  account: { email: string; name: string; password: string },
): Promise<void> {
  const problem = passwordProblem(account.password, account.email);
  if (problem) throw new InvalidInputError([{ pointer: '/password', message: problem }], 422);
  await throttle(context.db, throttleRules.registerFromAddress, context.address);
  const passwordHash = await hashPassword(account.password);
  const user = await insertUser(context.db, { email: account.email, name: account.name, passwordHash });
  await insertAuditEvent(context.db, { userId: user?.id ?? null, action: 'register-account' });
  const mailsTooMany = await countTry(context.db, throttleRules.mailToAccount, accountKey(account.email));
  if (mailsTooMany !== null) return;
  await context.mail.send(user ? welcomeMail(account, context.origin) : accountExistsMail(account, context.origin));
}
