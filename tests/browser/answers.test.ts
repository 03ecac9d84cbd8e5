import { describe, expect, it } from 'vitest';
import { baseUrl } from '@/tests/browser/helpers/browser';

const get = (path: string, init?: RequestInit) => fetch(`${baseUrl}${path}`, { redirect: 'manual', ...init });

describe('every answer', () => {
  it.each(['/sign-in', '/', '/no-such-page', '/api/health', '/tiles-sample/land.json'])(
    '%s has the safe headers',
    async (path) => {
      const { headers } = await get(path);
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('referrer-policy')).toBe('same-origin');
      expect(headers.get('x-frame-options')).toBe('DENY');
      expect(headers.get('permissions-policy')).toContain('camera=()');
      expect(headers.get('x-powered-by')).toBeNull();
    },
  );

  it('of a page allows its own scripts by a nonce that each of them carries', async () => {
    const answer = await get('/sign-in');
    const policy = answer.headers.get('content-security-policy') ?? '';
    const nonce = /script-src 'self' 'nonce-([^']+)' 'strict-dynamic';/.exec(policy)?.[1];
    expect(nonce).toBeTruthy();
    expect(policy).toContain("frame-ancestors 'none'");
    const html = await answer.text();
    const scripts = html.match(/<script\b[^>]*>/g) ?? [];
    expect(scripts.length).toBeGreaterThan(0);
    for (const script of scripts) expect(script).toContain(`nonce="${nonce}"`);
    expect(html).not.toMatch(/<[a-z][^>]*\sstyle="/i);
  });

  it('of a route lets nothing load', async () => {
    const { headers } = await get('/api/health');
    expect(headers.get('content-security-policy')).toContain("default-src 'none'");
  });
});

describe('the routes for programs', () => {
  it('tell that the server is well', async () => {
    const answer = await get('/api/health');
    expect([answer.status, await answer.json()]).toEqual([200, { status: 'ok', database: 'ok' }]);
  });

  it('describe themselves', async () => {
    const document = (await (await get('/api/openapi.json')).json()) as { openapi: string; paths: object };
    expect(document.openapi).toMatch(/^3\.1/);
    expect(document.paths).toHaveProperty('/api/check');
  });

  const json = { 'content-type': 'application/json', origin: baseUrl };
  it.each([
    ['without a sign-in', 401, json, '{}'],
    ['with a token that is none', 401, { ...json, authorization: 'Bearer nothing' }, '{}'],
    ['from another site', 403, { ...json, origin: 'https://elsewhere.example.org' }, '{}'],
    ['from a sandboxed page', 403, { ...json, origin: 'null' }, '{}'],
  ])('answer a check %s by problem details, %i', async (_what, status, headers, body) => {
    const answer = await get('/api/check', { method: 'POST', headers, body });
    expect(answer.status).toBe(status);
    expect(answer.headers.get('content-type')).toContain('application/problem+json');
    expect(await answer.json()).toMatchObject({ status, title: expect.any(String) as string });
  });
});
