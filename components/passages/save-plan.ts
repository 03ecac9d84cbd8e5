import type { PassagePlan } from '@/lib/schemas/passage-plan';

export type SaveOutcome =
  | { readonly kind: 'saved'; readonly revision: number }
  | { readonly kind: 'fields'; readonly problems: ReadonlyMap<string, string>; readonly detail: string }
  | { readonly kind: 'conflict'; readonly detail: string }
  | { readonly kind: 'signed-out' }
  | { readonly kind: 'failed'; readonly detail: string };

interface Problem {
  readonly title?: string;
  readonly detail?: string;
  readonly errors?: readonly { readonly pointer: string; readonly detail: string }[];
}

/** Sends the plan to be stored. Never throws: whatever goes wrong comes back in words, and the page keeps the plan. */
export async function savePlan(
  passageId: string,
  plan: PassagePlan,
  basedOnRevision: number,
  send: typeof fetch = fetch,
): Promise<SaveOutcome> {
  let response: Response;
  try {
    response = await send(`/api/passages/${passageId}`, {
      method: 'PUT',
      headers: { 'content-type': 'application/json', accept: 'application/json' },
      body: JSON.stringify({ plan, basedOnRevision }),
    });
  } catch {
    return { kind: 'failed', detail: 'The server could not be reached. Nothing is lost here: try again.' };
  }
  const body: unknown = await response.json().catch(() => null);
  if (response.ok) {
    const revision = (body as { revision?: unknown } | null)?.revision;
    if (typeof revision === 'number') return { kind: 'saved', revision };
    return { kind: 'failed', detail: 'The server’s answer could not be read. Reload to see what was stored.' };
  }
  return toOutcome(response.status, (body ?? {}) as Problem);
}

function toOutcome(status: number, problem: Problem): SaveOutcome {
  const detail = problem.detail ?? problem.title ?? `The server answered with status ${status}.`;
  if (status === 401) return { kind: 'signed-out' };
  if (status === 409) return { kind: 'conflict', detail };
  if ((status === 400 || status === 422) && problem.errors && problem.errors.length > 0) {
    return { kind: 'fields', detail, problems: byPointer(problem.errors) };
  }
  return { kind: 'failed', detail };
}

/** The request wraps the plan; its fields are known here without that. */
function byPointer(errors: NonNullable<Problem['errors']>): ReadonlyMap<string, string> {
  return new Map(errors.map(({ pointer, detail }) => [pointer.replace(/^#?\/plan(?=\/|$)/, ''), detail]));
}

/** The revision the server has now, to save over it knowingly; null where it cannot be read. */
export async function readRevision(passageId: string, send: typeof fetch = fetch): Promise<number | null> {
  try {
    const response = await send(`/api/passages/${passageId}`, { headers: { accept: 'application/json' } });
    const body: unknown = await response.json();
    const holder = body as { revision?: unknown; passage?: { revision?: unknown } };
    const revision = holder.revision ?? holder.passage?.revision;
    return response.ok && typeof revision === 'number' ? revision : null;
  } catch {
    return null;
  }
}
