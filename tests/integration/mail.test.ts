import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { fakeMailbox } from '@/lib/adapters/mail/fake-mailbox';
import { sendMail } from '@/lib/adapters/mail/send-mail';

const before = { fake: process.env.TWOBOW_MAIL_FAKE, smtp: process.env.TWOBOW_SMTP_URL };
beforeAll(() => {
  process.env.TWOBOW_MAIL_FAKE = '1';
  delete process.env.TWOBOW_SMTP_URL;
});
afterAll(() => {
  for (const [name, value] of [
    ['TWOBOW_MAIL_FAKE', before.fake],
    ['TWOBOW_SMTP_URL', before.smtp],
  ] as const) {
    if (value === undefined) delete process.env[name];
    else process.env[name] = value;
  }
});

describe('mail', () => {
  it('goes by SMTP to the local fake and can be read there, newest first', async () => {
    const text = `Grüße — open:\n\nhttps://twobow.example.org/reset/${'a'.repeat(90)}\n.\n..\n`;
    await sendMail({ to: 'one@example.org', subject: 'First', text });
    await sendMail({ to: 'two@example.org', subject: 'Second', text: 'short\n' });
    const { mails } = await fakeMailbox();
    expect(mails.map((mail) => [mail.to, mail.subject])).toEqual([
      ['two@example.org', 'Second'],
      ['one@example.org', 'First'],
    ]);
    expect(mails.map((mail) => mail.text)).toEqual(['short\n', text]);
  });

  it('takes an address as one address, whatever is in it', async () => {
    await sendMail({ to: '"a,b"@example.org', subject: 'Odd', text: 'x' });
    expect((await fakeMailbox()).mails[0]!.to).toMatch(/example\.org$/);
    expect((await fakeMailbox()).mails[0]!.to).not.toContain(', ');
  });

  it('cannot be sent where neither a server nor the fake is set, and says how to set one', async () => {
    process.env.TWOBOW_MAIL_FAKE = '';
    const attempt = sendMail({ to: 'one@example.org', subject: 'Never', text: 'x' });
    await expect(attempt).rejects.toThrow('TWOBOW_SMTP_URL');
    process.env.TWOBOW_MAIL_FAKE = '1';
  });
});
