import { newBoatSchema } from '@/lib/schemas/boat-requests';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import { listBoats } from '@/lib/usecases/boats/list-boats';
import { contextOf } from '@/lib/web/contexts';
import { route } from '@/lib/web/route';

export const GET = route({ auth: 'user' }, ({ user }) => listBoats(contextOf(user)));

export const POST = route({ auth: 'user', body: newBoatSchema }, async ({ user, body }) => {
  const { id } = await createBoat(contextOf(user), body.name, body.sheet);
  return Response.json({ id }, { status: 201, headers: { location: `/api/boats/${id}` } });
});
