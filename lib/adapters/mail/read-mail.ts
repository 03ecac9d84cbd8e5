export interface ReceivedMail {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly receivedAt: Date;
}

/**
 * Reads a mail of our own: plain text in base64, ASCII subject. Form: RFC 5322 (headers, an empty line, the
 * body; a header goes on where a line starts with a space).
 */
export function readMail(raw: string, to: string, receivedAt: Date): ReceivedMail {
  const unix = raw.replace(/\r\n/g, '\n');
  const gap = unix.indexOf('\n\n');
  const headers = unix.slice(0, gap).replace(/\n[ \t]+/g, ' ');
  const subject = /^subject: *(.*)$/im.exec(headers)?.[1] ?? '';
  return { to, subject, text: Buffer.from(unix.slice(gap + 2), 'base64').toString('utf8'), receivedAt };
}
