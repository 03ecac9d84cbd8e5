import { pino } from 'pino';
import { env } from '@/lib/env';

/** Structured log of the server. Secrets never enter it: headers and bodies are not logged whole. */
export const log = pino({
  level: env().logLevel,
  base: { app: 'twobow' },
  redact: ['password', '*.password', 'token', '*.token', 'authorization', '*.authorization', 'cookie', '*.cookie'],
});
