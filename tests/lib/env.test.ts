import { afterEach, describe, expect, it, vi } from 'vitest';
import { env } from '@/lib/env';

describe('the settings', () => {
  afterEach(() => vi.unstubAllEnvs());

  it('names a missing one when it is asked for, and not before', () => {
    vi.stubEnv('DATABASE_URL', '');
    const settings = env();
    expect(() => settings.databaseUrl).toThrow('DATABASE_URL');
  });

  it.each([
    ['NEXTAUTH_SECRET', 'short', (settings: ReturnType<typeof env>) => settings.nextAuthSecret],
    ['NEXTAUTH_URL', 'twobow', (settings: ReturnType<typeof env>) => settings.nextAuthUrl],
    ['PORT', '70000', (settings: ReturnType<typeof env>) => settings.port],
    ['TWOBOW_TRUSTED_PROXIES', 'many', (settings: ReturnType<typeof env>) => settings.trustedProxies],
  ])('refuses a wrong %s and does not repeat its value', (name, value, read) => {
    vi.stubEnv(name, value);
    expect(() => read(env())).toThrow(name);
    expect(() => read(env())).not.toThrow(value);
  });

  it.each([
    ['1', true],
    ['true', true],
    ['on', true],
    ['0', false],
    ['', false],
    ['no', false],
  ])('reads the switch “%s” as %s', (value, on) => {
    vi.stubEnv('TWOBOW_DEMO', value);
    expect(env().demoSeed).toBe(on);
  });

  it('has no demo, no fake mail and loopback where nothing is said', () => {
    for (const name of ['TWOBOW_DEMO', 'TWOBOW_MAIL_FAKE', 'HOST', 'PORT', 'TWOBOW_SMTP_URL']) vi.stubEnv(name, '');
    const { demoSeed, mailFake, host, port, smtpUrl } = env();
    expect({ demoSeed, mailFake, host, port, smtpUrl }).toEqual({
      demoSeed: false,
      mailFake: false,
      host: '127.0.0.1',
      port: 3000,
      smtpUrl: undefined,
    });
  });
});
