import { extendZodWithOpenApi, type ResponseConfig } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';

extendZodWithOpenApi(z);

export const problemSchema = z
  .object({
    type: z.string().meta({ description: 'What kind of problem, as a URN: urn:twobow:problem:invalid-input' }),
    title: z.string(),
    status: z.number().int(),
    detail: z.string().optional(),
    instance: z.string().optional().meta({ description: 'The number of a fault of ours' }),
    errors: z
      .array(z.object({ pointer: z.string().meta({ description: 'JSON pointer of the field' }), detail: z.string() }))
      .optional(),
  })
  .openapi('Problem', { description: 'Problem details, RFC 9457' });

/** Who may call a route: a signed-in browser, or a program with a personal token. */
export const signedIn: Record<string, string[]>[] = [{ session: [] }, { personalToken: [] }];

const meanings = {
  400: 'Not well formed; each field is named',
  401: 'Not signed in',
  403: 'Not allowed, or from another site',
  404: 'Not here, or not shared with you',
  409: 'Saved by somebody else in between',
  413: 'The body is too large',
  415: 'The body is not sent as JSON',
  422: 'Well formed, but impossible; each field is named',
  429: 'Too many tries; Retry-After says when to try again',
} as const;

/** The problem answers that a route may give, by their status. */
export function problems(...statuses: (keyof typeof meanings)[]): Record<string, ResponseConfig> {
  const content = { 'application/problem+json': { schema: problemSchema } };
  const entries = statuses.map((status) => [String(status), { description: meanings[status], content }] as const);
  const fault = { description: 'A fault of ours; instance is its number', content };
  return Object.fromEntries([...entries, ['500', fault]]);
}

/** A good answer of JSON. */
export function answer(description: string, schema: z.ZodType): ResponseConfig {
  return { description, content: { 'application/json': { schema } } };
}

/** A body of JSON that must be sent. */
export function jsonBody(schema: z.ZodType) {
  return { required: true, content: { 'application/json': { schema } } };
}
