import type { z } from 'zod';
import { ExpectedError, NotSignedInError } from '@/lib/errors';
import { toInvalidInput } from '@/lib/schemas/to-field-problems';
import { checkOrigin } from '@/lib/web/check-origin';
import { errorResponse, problemOf, problemResponse } from '@/lib/web/problem';
import { readJsonBody } from '@/lib/web/read-json-body';

export interface SignedInUser {
  readonly id: string;
  readonly email: string;
  readonly name: string;
}

export interface RouteOptions<Auth extends 'user' | 'none', Body extends z.ZodType | undefined> {
  /** 'user': 401 without a session or a personal token. */
  readonly auth: Auth;
  /** The body's schema; without one no body is read. */
  readonly body?: Body;
  readonly maxBodyBytes?: number;
}

export interface RouteInput<
  Auth extends 'user' | 'none',
  Body extends z.ZodType | undefined,
  Params extends Record<string, string>,
> {
  readonly user: Auth extends 'user' ? SignedInUser : SignedInUser | null;
  readonly body: Body extends z.ZodType ? z.output<Body> : undefined;
  readonly request: Request;
  readonly params: Params;
}

/** What the guard needs of the world around it. */
export interface GuardWorld {
  currentUser(request: Request): Promise<SignedInUser | null>;
  ownOrigin(): string | null;
  /** Records a fault of ours and gives the id under which it can be found. */
  recordFault(error: unknown, request: Request): string;
}

const DEFAULT_MAX_BODY_BYTES = 1_000_000;

/**
 * Makes `route`: the one guard of every JSON route. It checks where a change comes from, who asks, how much
 * is sent and whether it fits its schema; then calls the handler. What the handler gives becomes JSON, an
 * expected error becomes problem details with its own status, anything else is recorded and becomes a
 * plain 500.
 */
export function createGuard(world: GuardWorld) {
  return function route<
    Auth extends 'user' | 'none',
    Body extends z.ZodType | undefined = undefined,
    Params extends Record<string, string> = Record<string, string>,
  >(options: RouteOptions<Auth, Body>, handle: (input: RouteInput<Auth, Body, Params>) => unknown) {
    return async (request: Request, context: { params: Promise<Params> }): Promise<Response> => {
      try {
        checkOrigin(request, world.ownOrigin());
        const user = options.auth === 'user' ? await world.currentUser(request) : null;
        if (options.auth === 'user' && !user) throw new NotSignedInError();
        const body = options.body ? await readValid(request, options.body, options.maxBodyBytes) : undefined;
        const input = { user, body, request, params: await context.params } as RouteInput<Auth, Body, Params>;
        return toResponse(await handle(input));
      } catch (error) {
        if (error instanceof ExpectedError) return errorResponse(error);
        const id = world.recordFault(error, request);
        const detail = `Something failed on our side. Nothing was saved. Its number is ${id}.`;
        return problemResponse(problemOf(500, 'fault', { detail, instance: `urn:uuid:${id}` }));
      }
    };
  };
}

async function readValid(request: Request, schema: z.ZodType, maxBytes = DEFAULT_MAX_BODY_BYTES): Promise<unknown> {
  const parsed = schema.safeParse(await readJsonBody(request, maxBytes));
  if (!parsed.success) throw toInvalidInput(parsed.error);
  return parsed.data;
}

function toResponse(value: unknown): Response {
  if (value instanceof Response) return value;
  if (value === undefined || value === null) return new Response(null, { status: 204 });
  return Response.json(value, { headers: { 'cache-control': 'no-store' } });
}
