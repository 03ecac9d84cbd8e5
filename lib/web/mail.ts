import 'server-only';
import { after } from 'next/server';
import { sendMail } from '@/lib/adapters/mail/send-mail';
import type { MailSender } from '@/lib/usecases/context';
import { log } from '@/lib/web/log';

/**
 * Sends after the answer has gone out, so that the time of an answer does not tell whether a mail was sent.
 * A mail that fails is logged; the person can ask for another.
 */
export const mailSender: MailSender = {
  async send(mail) {
    after(async () => {
      try {
        await sendMail(mail);
      } catch (error) {
        log.error({ err: error, subject: mail.subject }, 'mail not sent');
      }
    });
  },
};
