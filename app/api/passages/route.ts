import { newPassageSchema } from '@/lib/schemas/passage-requests';
import { createPassage } from '@/lib/usecases/passages/create-passage';
import { listPassages } from '@/lib/usecases/passages/list-passages';
import { contextOf } from '@/lib/web/contexts';
import { route } from '@/lib/web/route';

export const GET = route({ auth: 'user' }, ({ user, request }) => {
  const boatId = new URL(request.url).searchParams.get('boatId');
  return listPassages(contextOf(user), boatId === null ? {} : { boatId });
});

export const POST = route({ auth: 'user', body: newPassageSchema }, async ({ user, body }) => {
  const { id } = await createPassage(contextOf(user), body.boatId, { name: body.name, zone: body.zone });
  return Response.json({ id }, { status: 201, headers: { location: `/api/passages/${id}` } });
});
