import { NotAllowedError } from '@/lib/errors';

const FOREIGN = 'This request came from another site, and changes are taken from our own pages only.';

/**
 * Refuses a change that another site's page makes in a signed-in person's browser.
 *
 * Browsers name the page's origin on every such request; "null" is a sandboxed or redirected page and is
 * foreign too. A personal token is never sent by a browser of itself, so its requests pass. A request with
 * neither is not a browser's page, or one that a form cannot make: then JSON must be its content type.
 */
export function checkOrigin(request: Request, ownOrigin: string | null): void {
  if (isSafe(request.method) || hasBearerToken(request)) return;
  const origin = request.headers.get('origin');
  if (origin !== null) {
    if (!isOwn(origin, request.headers.get('host'), ownOrigin)) throw new NotAllowedError(FOREIGN);
    return;
  }
  const site = request.headers.get('sec-fetch-site');
  if (site !== null && site !== 'same-origin') throw new NotAllowedError(FOREIGN);
  if (site === null && request.method === 'POST' && !isJson(request)) throw new NotAllowedError(FOREIGN);
}

export function isJson(request: Request): boolean {
  const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase() ?? '';
  return type === 'application/json' || type.endsWith('+json');
}

function isSafe(method: string): boolean {
  return method === 'GET' || method === 'HEAD' || method === 'OPTIONS';
}

function hasBearerToken(request: Request): boolean {
  return /^bearer\s+\S/i.test(request.headers.get('authorization') ?? '');
}

/** Our own: the configured address, or the host that the browser itself says it is talking to. */
function isOwn(origin: string, host: string | null, ownOrigin: string | null): boolean {
  if (!URL.canParse(origin)) return false;
  const url = new URL(origin);
  return url.origin === ownOrigin || (host !== null && url.host === host.toLowerCase());
}
