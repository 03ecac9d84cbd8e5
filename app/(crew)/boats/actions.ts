'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import type { SaveBoatAnswer, SaveBoatRequest } from '@/components/boats/save-boat';
import { NotFoundError } from '@/lib/errors';
import { hideBoat } from '@/lib/usecases/boats/hide-boat';
import { restoreBoat } from '@/lib/usecases/boats/restore-boat';
import { contextOf, pageContext } from '@/lib/web/contexts';
import { sessionUser } from '@/lib/web/session';
import { answerSave } from './save-boat';

/** Who was signed out meanwhile is told so, and keeps the page with everything typed. */
export async function saveBoat(request: SaveBoatRequest): Promise<SaveBoatAnswer> {
  const user = await sessionUser();
  if (!user) return { kind: 'signed-out' };
  const answer = await answerSave(contextOf(user), request);
  if (answer.kind === 'saved') revalidatePath('/boats', 'layout');
  return answer;
}

export async function putAway(form: FormData): Promise<void> {
  const context = await pageContext('/boats');
  await hideBoat(context, String(form.get('id')));
  revalidatePath('/boats', 'layout');
  redirect('/boats');
}

/** One that is back already, or whose days are over, is not in the list that is shown next. */
export async function bringBack(form: FormData): Promise<void> {
  const context = await pageContext('/boats');
  try {
    await restoreBoat(context, String(form.get('id')));
  } catch (error) {
    if (!(error instanceof NotFoundError)) throw error;
  }
  revalidatePath('/boats', 'layout');
}
