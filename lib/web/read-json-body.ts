import { isJson } from '@/lib/web/check-origin';
import { ProblemError } from '@/lib/web/problem-error';

/**
 * The body as JSON. Its size is judged before it is read, by what it announces, and again while it comes
 * in, so that a large body is never held whole.
 *
 * @throws ProblemError 413 over `maxBytes`, 415 for another content type, 400 where it is not JSON.
 */
export async function readJsonBody(request: Request, maxBytes: number): Promise<unknown> {
  const announced = Number(request.headers.get('content-length') ?? '0');
  if (announced > maxBytes) throw tooLarge(maxBytes);
  if (!isJson(request)) {
    throw new ProblemError(415, 'wrong-content-type', 'Send the body as JSON, with “Content-Type: application/json”.');
  }
  const text = decode(await readCapped(request, maxBytes));
  if (text.trim() === '') throw notJson('the body is empty');
  try {
    return JSON.parse(text) as unknown;
  } catch (error) {
    throw notJson(error instanceof Error ? error.message : 'it cannot be read');
  }
}

async function readCapped(request: Request, maxBytes: number): Promise<Uint8Array> {
  const reader = request.body?.getReader();
  if (!reader) return new Uint8Array();
  const chunks: Uint8Array[] = [];
  let size = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return Buffer.concat(chunks);
    size += value.byteLength;
    if (size > maxBytes) {
      await reader.cancel().catch(() => undefined);
      throw tooLarge(maxBytes);
    }
    chunks.push(value);
  }
}

function decode(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw notJson('it is not UTF-8 text');
  }
}

function tooLarge(maxBytes: number): ProblemError {
  return new ProblemError(413, 'too-large', `The body is over ${maxBytes / 1000} kB. Send less at once.`);
}

function notJson(why: string): ProblemError {
  return new ProblemError(400, 'not-json', `The body is not JSON: ${why}.`);
}
