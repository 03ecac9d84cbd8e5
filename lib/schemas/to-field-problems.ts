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

/**
 * Every finding of a zod error as a field problem. The status is 400 where the shape is wrong, 422 where all
 * that is wrong is impossible values.
 */
export function toInvalidInput(error: z.core.$ZodError, prefix = ''): InvalidInputError {
  const fields: FieldProblem[] = error.issues.map((issue) => ({
    pointer: prefix + toPointer(issue.path),
    message: issue.message,
  }));
  return new InvalidInputError(fields, error.issues.every(isImpossible) ? 422 : 400);
}
