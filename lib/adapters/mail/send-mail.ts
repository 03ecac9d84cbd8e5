import { createTransport } from 'nodemailer';
import { env } from '@/lib/env';
import { fakeMailbox } from '@/lib/adapters/mail/fake-mailbox';

export interface OutgoingMail {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
}

/** Sends by SMTP: to the real server where one is set, else to the local fake where that is on. */
export async function sendMail(mail: OutgoingMail): Promise<void> {
  const transport = createTransport(await smtpUrl());
  try {
    await transport.sendMail({
      from: env().mailFrom,
      to: { name: '', address: mail.to },
      subject: mail.subject,
      text: mail.text,
      textEncoding: 'base64',
    });
  } finally {
    transport.close();
  }
}

async function smtpUrl(): Promise<string> {
  const { smtpUrl: real, mailFake } = env();
  if (mailFake) return (await fakeMailbox()).smtpUrl;
  if (real) return real;
  throw new Error('No mail can be sent: set TWOBOW_SMTP_URL, or TWOBOW_MAIL_FAKE=1 in development.');
}
