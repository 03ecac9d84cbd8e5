import { newBoatSheetSchema } from '@/lib/schemas/boat-requests';
import { listBoatSheets } from '@/lib/usecases/boats/list-boat-sheets';
import { saveBoatSheet } from '@/lib/usecases/boats/save-boat-sheet';
import { contextOf } from '@/lib/web/contexts';
import { route } from '@/lib/web/route';

export const GET = route({ auth: 'user' }, async ({ user, params }) => ({
  sheets: await listBoatSheets(contextOf(user), params.boatId ?? ''),
}));

export const POST = route({ auth: 'user', body: newBoatSheetSchema }, async ({ user, params, body }) => {
  const saved = await saveBoatSheet(contextOf(user), params.boatId ?? '', body.sheet, body.basedOnNumber);
  return Response.json(saved, { status: 201 });
});
