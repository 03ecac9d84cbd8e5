'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { NotFoundError } from '@/lib/errors';
import { hidePassage } from '@/lib/usecases/passages/hide-passage';
import { restorePassage } from '@/lib/usecases/passages/restore-passage';
import { pageContext } from '@/lib/web/contexts';

export async function putAway(form: FormData): Promise<void> {
  await hidePassage(await pageContext('/passages'), String(form.get('id')));
  revalidatePath('/passages', 'layout');
  redirect('/passages');
}

/** One that is back already, or whose days are over, is not in the list that is shown next. */
export async function bringBack(form: FormData): Promise<void> {
  try {
    await restorePassage(await pageContext('/passages'), String(form.get('id')));
  } catch (error) {
    if (!(error instanceof NotFoundError)) throw error;
  }
  revalidatePath('/passages', 'layout');
}
