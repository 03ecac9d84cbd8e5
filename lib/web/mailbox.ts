import 'server-only';
import { fakeMailbox } from '@/lib/adapters/mail/fake-mailbox';
import { isMailFake } from '@/lib/web/demo';

/** The mails kept on this server, newest first; null where mail is sent for real. */
export async function keptMails() {
  return isMailFake() ? (await fakeMailbox()).mails : null;
}
