import { describe, expect, it } from 'vitest';
import { readMail } from '@/lib/adapters/mail/read-mail';

const at = new Date('2026-06-01T12:00:00Z');
const mail = (encoding: string, body: string) =>
  `From: a@example.org\r\nSubject: A long\r\n subject\r\nContent-Transfer-Encoding: ${encoding}\r\n\r\n${body}`;

describe('reading a mail', () => {
  it.each([
    ['7bit', 'Sign in:\r\n\r\nhere\r\n', 'Sign in:\n\nhere\n'],
    ['base64', 'R3LDvMOfZTog\r\naGVyZQ==\r\n', 'Grüße: here'],
    ['quoted-printable', 'Gr=C3=BC=C3=9Fe: a=3Db and a long=\r\n line\r\n', 'Grüße: a=b and a long line\n'],
  ])('in %s', (encoding, body, text) => {
    expect(readMail(mail(encoding, body), 'one@example.org', at)).toEqual({
      to: 'one@example.org',
      subject: 'A long subject',
      text,
      receivedAt: at,
    });
  });
});
