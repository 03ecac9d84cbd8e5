import 'server-only';
import { randomUUID } from 'node:crypto';
import type { SaveBoatAnswer, SaveBoatRequest } from '@/components/boats/save-boat';
import { ConflictError, ExpectedError, InvalidInputError } from '@/lib/errors';
import { newBoatSchema } from '@/lib/schemas/boat-requests';
import { toInvalidInput } from '@/lib/schemas/to-field-problems';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { renameBoat } from '@/lib/usecases/boats/rename-boat';
import { saveBoatSheet } from '@/lib/usecases/boats/save-boat-sheet';
import type { Context } from '@/lib/usecases/context';
import { log } from '@/lib/web/log';

/** Stores a typed boat sheet; whatever stands in the way comes back in words, never as an exception. */
export async function answerSave(context: Context, request: SaveBoatRequest): Promise<SaveBoatAnswer> {
  try {
    return await store(context, request);
  } catch (error) {
    if (error instanceof InvalidInputError) return { kind: 'fields', problems: error.fields };
    if (error instanceof ConflictError) return conflict(context, request, error);
    if (error instanceof ExpectedError) return { kind: 'refused', message: error.message };
    const id = randomUUID();
    log.error({ fault: id, err: error }, 'fault in saving a boat sheet');
    return { kind: 'refused', message: `Something failed on our side. Nothing was saved. Its number is ${id}.` };
  }
}

async function conflict(context: Context, request: SaveBoatRequest, error: ConflictError): Promise<SaveBoatAnswer> {
  const { newestNumber } = await openBoat(context, String(request.boatId));
  return { kind: 'conflict', message: error.message, newestNumber };
}

async function store(
  context: Context,
  { boatId, basedOnNumber, name, sheet }: SaveBoatRequest,
): Promise<SaveBoatAnswer> {
  const parsed = newBoatSchema.safeParse({ name, sheet });
  if (!parsed.success) throw toInvalidInput(parsed.error);
  const given = parsed.data;
  if (boatId === null) {
    const made = await createBoat(context, given.name, given.sheet);
    return { kind: 'saved', boatId: made.id, number: 1 };
  }
  const before = await openBoat(context, boatId);
  const { number } = await saveBoatSheet(context, boatId, given.sheet, Number(basedOnNumber));
  if (given.name !== before.name) await renameBoat(context, boatId, given.name);
  return { kind: 'saved', boatId, number };
}
