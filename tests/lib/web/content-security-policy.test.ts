import { NextRequest } from 'next/server';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { proxy } from '@/proxy';

function policyOf(mode: string) {
  vi.stubEnv('NODE_ENV', mode);
  const response = proxy(new NextRequest('https://twobow.example.org/boats'));
  const policy = response.headers.get('content-security-policy') ?? '';
  return { response, policy, nonce: /'nonce-([^']+)'/.exec(policy)?.[1] };
}

describe('the content security policy of pages', () => {
  afterEach(() => vi.unstubAllEnvs());

  it('lets scripts and styles in by nonce alone', () => {
    const { policy, nonce } = policyOf('production');
    expect(nonce).toMatch(/^[A-Za-z0-9+/]{24}$/);
    expect(policy).toBe(
      `default-src 'self'; script-src 'self' 'nonce-${nonce}' 'strict-dynamic'; style-src 'self' 'nonce-${nonce}'; ` +
        "img-src 'self' data: blob:; font-src 'self'; connect-src 'self'; worker-src 'self'; object-src 'none'; " +
        "base-uri 'none'; form-action 'self'; frame-ancestors 'none'",
    );
  });

  it('makes a new nonce for each request and hands it to the page', () => {
    const first = policyOf('production');
    expect(policyOf('production').nonce).not.toBe(first.nonce);
    expect(first.response.headers.get('x-middleware-request-x-nonce')).toBe(first.nonce);
    expect(first.response.headers.get('x-middleware-request-content-security-policy')).toBe(first.policy);
  });

  it('lets eval in only while developing', () => {
    expect(policyOf('production').policy).not.toContain('unsafe');
    expect(policyOf('development').policy).toContain("'unsafe-eval'");
  });
});
