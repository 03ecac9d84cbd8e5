import 'server-only';
import { randomUUID } from 'node:crypto';
import { env } from '@/lib/env';
import { createGuard } from '@/lib/web/guard';
import { log } from '@/lib/web/log';
import { currentUser } from '@/lib/web/session';

/** The guard of every JSON route, with this server's session, address and log. See lib/web/guard.ts. */
export const route = createGuard({
  currentUser,
  ownOrigin: () => new URL(env().nextAuthUrl).origin,
  recordFault(error, request) {
    const id = randomUUID();
    log.error({ fault: id, method: request.method, path: new URL(request.url).pathname, err: error }, 'fault');
    return id;
  },
});
