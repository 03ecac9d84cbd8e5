import type { AddressInfo } from 'node:net';
import { env } from '@/lib/env';
import { readMail, type ReceivedMail } from '@/lib/adapters/mail/read-mail';

export interface FakeMailbox {
  readonly smtpUrl: string;
  /** Newest first. */
  readonly mails: readonly ReceivedMail[];
}

const MOST_MAILS = 200;
const kept = globalThis as typeof globalThis & { __twobowMailbox?: Promise<FakeMailbox> };

/** An SMTP server of this process on a free loopback port that keeps what it gets. Only where asked for by name. */
export function fakeMailbox(): Promise<FakeMailbox> {
  if (!env().mailFake) throw new Error('The fake mailbox is off: TWOBOW_MAIL_FAKE is not set.');
  kept.__twobowMailbox ??= open();
  return kept.__twobowMailbox;
}

async function open(): Promise<FakeMailbox> {
  const { SMTPServer } = await import('smtp-server');
  const mails: ReceivedMail[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: 1_000_000,
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const to = session.envelope.rcptTo.map((recipient) => recipient.address).join(', ');
        mails.unshift(readMail(Buffer.concat(chunks).toString('utf8'), to, new Date()));
        mails.length = Math.min(mails.length, MOST_MAILS);
        done();
      });
    },
  });
  const listening = await new Promise<AddressInfo>((resolve, reject) => {
    server.on('error', reject);
    const listener = server.listen(0, '127.0.0.1', () => {
      listener.unref();
      resolve(listener.address() as AddressInfo);
    });
  });
  return { smtpUrl: `smtp://127.0.0.1:${listening.port}`, mails };
}
