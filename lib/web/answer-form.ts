import 'server-only';
import { randomUUID } from 'node:crypto';
import { unstable_rethrow } from 'next/navigation';
import type { z } from 'zod';
import { ExpectedError, type FieldProblem, InvalidInputError } from '@/lib/errors';
import type { FormState } from '@/lib/schemas/form-state';
import { toInvalidInput } from '@/lib/schemas/to-field-problems';
import { log } from '@/lib/web/log';

/**
 * The guard of every form's action: checks the fields, does the work, and answers in the form's terms. An
 * expected error is shown, at its field where it names one; any other is logged with an id.
 */
export async function answerForm<Schema extends z.ZodType>(
  form: FormData,
  schema: Schema,
  work: (data: z.output<Schema>) => Promise<Partial<FormState> | void>,
): Promise<FormState> {
  const typed = Object.fromEntries(
    [...form].filter((entry): entry is [string, string] => typeof entry[1] === 'string'),
  );
  const values = Object.fromEntries(Object.entries(typed).filter(([name]) => !/password|token|^\$/i.test(name)));
  try {
    const parsed = schema.safeParse(typed);
    if (!parsed.success) throw toInvalidInput(parsed.error);
    return { values: {}, problems: {}, done: true, ...(await work(parsed.data)) };
  } catch (error) {
    unstable_rethrow(error);
    if (error instanceof InvalidInputError) return { values, ...byField(error.fields, typed) };
    if (error instanceof ExpectedError) return { values, problems: {}, problem: error.message };
    const id = randomUUID();
    log.error({ fault: id, err: error }, 'fault in a form');
    return { values, problems: {}, problem: `Something failed on our side. Nothing was saved. Its number is ${id}.` };
  }
}

function byField(
  fields: readonly FieldProblem[],
  typed: Record<string, string>,
): Pick<FormState, 'problems' | 'problem'> {
  const problems: Record<string, string> = {};
  const rest: string[] = [];
  for (const { pointer, message } of fields) {
    const name = pointer.split('/')[1] ?? '';
    if (name in typed && name !== 'token') problems[name] ??= message;
    else rest.push(message);
  }
  return rest.length > 0 ? { problems, problem: rest.join(' ') } : { problems };
}
