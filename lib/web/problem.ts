import { ExpectedError, InvalidInputError, TooManyTriesError } from '@/lib/errors';

/** Problem details, RFC 9457; `errors` is our extension and follows its §3's example. */
export interface Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail?: string;
  readonly instance?: string;
  readonly errors?: readonly { readonly pointer: string; readonly detail: string }[];
}

const titles: Readonly<Record<number, string>> = {
  400: 'Not well formed',
  401: 'Not signed in',
  403: 'Not allowed',
  404: 'Not found',
  409: 'Saved by somebody else',
  413: 'Too large',
  415: 'Wrong content type',
  422: 'Well formed, but impossible',
  429: 'Too many tries',
  500: 'A fault of ours',
  503: 'Not available',
};

/** Builds a problem; `code` becomes the last part of its type, a URN that needs no server behind it. */
export function problemOf(status: number, code: string, more: Partial<Problem> = {}): Problem {
  return { type: `urn:twobow:problem:${code}`, title: titles[status] ?? 'Problem', status, ...more };
}

/** The answer to an expected error: its status, its words, each field named. */
export function problemOfError(error: ExpectedError): Problem {
  if (error instanceof InvalidInputError) {
    return problemOf(error.status, error.code, {
      detail: error.message,
      errors: error.fields.map((field) => ({ pointer: field.pointer, detail: field.message })),
    });
  }
  return problemOf(error.status, error.code, { detail: error.message });
}

/** A problem as a response, `application/problem+json`, never cached. */
export function problemResponse(problem: Problem, headers: Record<string, string> = {}): Response {
  return new Response(JSON.stringify(problem), {
    status: problem.status,
    headers: { 'content-type': 'application/problem+json; charset=utf-8', 'cache-control': 'no-store', ...headers },
  });
}

export function errorResponse(error: ExpectedError): Response {
  const headers: Record<string, string> = {};
  if (error instanceof TooManyTriesError) headers['retry-after'] = String(Math.ceil(error.retryAfterSeconds));
  if (error.status === 401) headers['www-authenticate'] = 'Bearer realm="twobow"';
  return problemResponse(problemOfError(error), headers);
}
