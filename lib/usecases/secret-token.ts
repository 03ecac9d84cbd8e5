import { createHash, randomBytes } from 'node:crypto';

/** An unguessable text of 256 random bits and its hash. Only the hash is stored. */
export function newSecretToken(prefix = ''): { token: string; tokenHash: Buffer } {
  const token = prefix + randomBytes(32).toString('base64url');
  return { token, tokenHash: hashSecretToken(token) };
}

/** SHA-256: enough for a secret of 256 random bits, which cannot be tried out. */
export function hashSecretToken(token: string): Buffer {
  return createHash('sha256').update(token).digest();
}
