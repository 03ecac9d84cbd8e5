export interface ReceivedMail {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly receivedAt: Date;
}

/**
 * Reads a mail of our own: one part of plain text, ASCII subject. Forms: RFC 5322 (headers, an empty line,
 * the body; a header goes on where a line starts with a space) and RFC 2045 §6 (encodings of the body).
 */
export function readMail(raw: string, to: string, receivedAt: Date): ReceivedMail {
  const unix = raw.replace(/\r\n/g, '\n');
  const gap = unix.indexOf('\n\n');
  const headers = unix.slice(0, gap).replace(/\n[ \t]+/g, ' ');
  const header = (name: string) => new RegExp(`^${name}: *(.*)$`, 'im').exec(headers)?.[1] ?? '';
  const text = decode(unix.slice(gap + 2), header('content-transfer-encoding').toLowerCase());
  return { to, subject: header('subject'), text, receivedAt };
}

function decode(body: string, encoding: string): string {
  if (encoding === 'base64') return Buffer.from(body, 'base64').toString('utf8');
  if (encoding === 'quoted-printable') {
    const joined = body.replace(/=\n/g, '');
    const bytes = joined.replace(/=([0-9A-F]{2})/gi, (_match, hex: string) => String.fromCharCode(parseInt(hex, 16)));
    return Buffer.from(bytes, 'latin1').toString('utf8');
  }
  return body;
}
