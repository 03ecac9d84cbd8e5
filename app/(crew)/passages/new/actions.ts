'use server';

import { redirect } from 'next/navigation';
import type { NewPassageState } from '@/components/passages/new-passage-form';
import { ExpectedError } from '@/lib/errors';
import { newPassageSchema } from '@/lib/schemas/passage-requests';
import { toPointer } from '@/lib/schemas/to-field-problems';
import { createPassage } from '@/lib/usecases/passages/create-passage';
import { pageContext } from '@/lib/web/contexts';

/** Makes the passage and goes on to its planner; what was typed comes back with the messages where it cannot. */
export async function makePassage(_before: NewPassageState, form: FormData): Promise<NewPassageState> {
  const context = await pageContext('/passages/new');
  const typed = { boatId: text(form, 'boatId'), name: text(form, 'name'), zone: text(form, 'zone') };
  const parsed = newPassageSchema.safeParse(typed);
  if (!parsed.success) {
    const problems = Object.fromEntries(parsed.error.issues.map(({ path, message }) => [toPointer(path), message]));
    return { typed, problems };
  }
  const { boatId, name, zone } = parsed.data;
  let id: string;
  try {
    ({ id } = await createPassage(context, boatId, { name, zone }));
  } catch (error) {
    if (error instanceof ExpectedError) return { typed, problems: { '': error.message } };
    throw error;
  }
  redirect(`/passages/${id}/plan`);
}

function text(form: FormData, key: string): string {
  const value = form.get(key);
  return typeof value === 'string' ? value : '';
}
