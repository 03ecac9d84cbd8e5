import type { z } from 'zod';
import { InvalidInputError, type FieldProblem } from '@/lib/errors';

type Issue = z.core.$ZodIssue;

/** A number in its place but out of range, or a contradiction between fields: well formed, but impossible. */
function isImpossible(issue: Issue): boolean {
  if (issue.code === 'custom') return true;
  return (issue.code === 'too_small' || issue.code === 'too_big') && issue.origin === 'number';
}

/** JSON pointer of a path, RFC 6901 §3: "~" and "/" inside a key are escaped. */
export function toPointer(path: readonly PropertyKey[]): string {
  return path.map((key) => `/${String(key).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}

const KINDS: Readonly<Record<string, string>> = {
  array: 'a list',
  object: 'an object',
  string: 'a text',
  number: 'a number',
  boolean: 'true or false',
};

/** A schema's own words; where it has none, what is missing or of the wrong kind, in ours. */
function messageOf(issue: Issue): string {
  if (issue.code !== 'invalid_type' || !issue.message.startsWith('Invalid input')) return issue.message;
  const field = String(issue.path[issue.path.length - 1] ?? 'the body');
  const wanted = KINDS[issue.expected] ?? issue.expected;
  return issue.message.endsWith('undefined')
    ? `${field} is missing: give ${wanted}.`
    : `${field} is of the wrong kind: give ${wanted}.`;
}

/**
 * Every finding of a zod error as a field problem. The status is 400 where the shape is wrong, 422 where all
 * that is wrong is impossible values.
 */
export function toInvalidInput(error: z.core.$ZodError, prefix = ''): InvalidInputError {
  const fields: FieldProblem[] = error.issues.map((issue) => ({
    pointer: prefix + toPointer(issue.path),
    message: messageOf(issue),
  }));
  return new InvalidInputError(fields, error.issues.every(isImpossible) ? 422 : 400);
}
