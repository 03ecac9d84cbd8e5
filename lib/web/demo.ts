import 'server-only';
import { env } from '@/lib/env';

/** Whether this server carries the demo: its boat, people and sample forecast. */
export function isDemo(): boolean {
  return env().demoSeed;
}

/** Whether mails are kept here to be read at /dev/mail instead of being sent. */
export function isMailFake(): boolean {
  return env().mailFake;
}
