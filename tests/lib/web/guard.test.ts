import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { ConflictError, TooManyTriesError } from '@/lib/errors';
import { createGuard, type SignedInUser } from '@/lib/web/guard';

const OWN = 'https://twobow.example.org';
const ada: SignedInUser = { id: '1', email: 'ada@example.org', name: 'Ada' };
const schema = z.object({ spanM: z.number().min(1, { error: 'Span: too small.' }) });

function setUp(user: SignedInUser | null = ada) {
  const faults: unknown[] = [];
  const route = createGuard({
    currentUser: () => Promise.resolve(user),
    ownOrigin: () => OWN,
    recordFault: (error) => `fault-${faults.push(error)}`,
  });
  return { faults, route };
}

const context = { params: Promise.resolve({}) };

function post(body: BodyInit | undefined, headers: Record<string, string> = {}): Request {
  const all = { host: 'twobow.example.org', origin: OWN, 'content-type': 'application/json', ...headers };
  const kept = Object.fromEntries(Object.entries(all).filter(([, value]) => value !== ''));
  return new Request(`${OWN}/api/x`, { method: 'POST', headers: kept, body, duplex: 'half' } as RequestInit);
}

async function ask(request: Request, user: SignedInUser | null = ada) {
  const { route } = setUp(user);
  const answer = await route({ auth: 'user', body: schema, maxBodyBytes: 100 }, ({ body }) => body)(request, context);
  return { status: answer.status, type: answer.headers.get('content-type'), json: (await answer.json()) as unknown };
}

const good = JSON.stringify({ spanM: 3 });

describe('the guard of JSON routes', () => {
  it('gives the handler a valid body and answers JSON that nobody keeps', async () => {
    const { route } = setUp();
    const answer = await route({ auth: 'user', body: schema }, ({ user, body }) => ({ user, body }))(
      post(good),
      context,
    );
    expect(answer.headers.get('cache-control')).toBe('no-store');
    expect(await answer.json()).toEqual({ user: ada, body: { spanM: 3 } });
  });

  it('answers 204 where the handler gives nothing', async () => {
    const answer = await setUp().route({ auth: 'none' }, () => undefined)(post(good), context);
    expect(answer.status).toBe(204);
  });

  it('gives the parameters of the path', async () => {
    const read = setUp().route({ auth: 'none' }, ({ params }) => params);
    const answer = await read(new Request(`${OWN}/api/x`), { params: Promise.resolve({ boatId: '7' }) });
    expect(await answer.json()).toEqual({ boatId: '7' });
  });

  it('asks for a sign-in before it reads anything', async () => {
    const { status, type, json } = await ask(post('not json'), null);
    expect(status).toBe(401);
    expect(type).toContain('application/problem+json');
    expect(json).toMatchObject({ type: 'urn:twobow:problem:not-signed-in', title: 'Not signed in', status: 401 });
  });

  it.each([
    ['another origin', { origin: 'https://elsewhere.example.org' }],
    ['the origin of a sandboxed page', { origin: 'null' }],
    ['the own host over another port', { origin: 'https://twobow.example.org:444' }],
    ['no origin, from another site', { origin: '', 'sec-fetch-site': 'cross-site' }],
    ['no origin and a content type that a form can send', { origin: '', 'content-type': 'text/plain' }],
    ['no origin and no content type', { origin: '', 'content-type': '' }],
  ])('refuses %s', async (_what, headers) => {
    expect((await ask(post(new TextEncoder().encode(good), headers))).status).toBe(403);
  });

  it.each([
    ['our own origin', {}],
    ['the host that the browser names', { origin: 'http://127.0.0.1:3000', host: '127.0.0.1:3000' }],
    ['JSON without an origin', { origin: '' }],
    ['a personal token from a program', { origin: '', authorization: 'Bearer abc' }],
  ])('takes %s', async (_what, headers) => {
    expect((await ask(post(good, headers))).status).toBe(200);
  });

  it.each([
    ['another content type', 415, good, { 'content-type': 'text/plain' }],
    ['no content type', 415, new TextEncoder().encode(good), { 'content-type': '' }],
    ['a body that is not JSON', 400, '{"spanM":', {}],
    ['an empty body', 400, '', {}],
    ['bytes that are no text', 400, new Uint8Array([0xff, 0xfe, 0x22]), {}],
    ['JSON of another shape', 400, '[]', {}],
    ['an impossible value', 422, '{"spanM":0}', {}],
    ['more than the cap', 413, JSON.stringify({ spanM: 3, filler: 'x'.repeat(200) }), {}],
    ['an announced size over the cap', 413, good, { 'content-length': '50000000' }],
  ])('answers %s with %i', async (_what, status, body, headers) => {
    const answer = await ask(post(body, headers));
    expect(answer.status).toBe(status);
    expect(answer.type).toContain('application/problem+json');
  });

  it('names each wrong field', async () => {
    expect((await ask(post('{"spanM":0}'))).json).toMatchObject({
      errors: [{ pointer: '/spanM', detail: 'Span: too small.' }],
    });
  });

  it('stops reading a stream at the cap', async () => {
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 64;
        controller.enqueue(new Uint8Array(64).fill(0x20));
      },
    });
    expect((await ask(post(endless))).status).toBe(413);
    expect(sent).toBeLessThan(1000);
  });

  it('answers an expected error with its own status and words', async () => {
    const answer = await setUp().route({ auth: 'none' }, () => {
      throw new ConflictError('Ben saved sheet 4 in between.');
    })(post(good), context);
    expect(answer.status).toBe(409);
    expect(await answer.json()).toMatchObject({ detail: 'Ben saved sheet 4 in between.' });
  });

  it('says when to try again', async () => {
    const answer = await setUp().route({ auth: 'none' }, () => Promise.reject(new TooManyTriesError(90.2)))(
      post(good),
      context,
    );
    expect([answer.status, answer.headers.get('retry-after')]).toEqual([429, '91']);
  });

  it('records a fault of ours and tells nothing of it but its number', async () => {
    const { faults, route } = setUp();
    const answer = await route({ auth: 'none' }, () => {
      throw new Error('password of the database');
    })(post(good), context);
    const text = await answer.text();
    expect(answer.status).toBe(500);
    expect(text).toContain('fault-1');
    expect(text).not.toContain('password');
    expect(faults).toHaveLength(1);
  });
});
