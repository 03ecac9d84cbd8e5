import 'server-only';
import { notFound } from 'next/navigation';
import { NotFoundError } from '@/lib/errors';

/** For pages: what is not there, or not shared with the person, becomes the not-found page. */
export async function orNotFound<Value>(load: Promise<Value>): Promise<Value> {
  try {
    return await load;
  } catch (error) {
    if (error instanceof NotFoundError) notFound();
    throw error;
  }
}
