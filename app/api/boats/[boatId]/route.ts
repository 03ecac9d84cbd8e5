import { boatRenameSchema } from '@/lib/schemas/boat-requests';
import { hideBoat } from '@/lib/usecases/boats/hide-boat';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { renameBoat } from '@/lib/usecases/boats/rename-boat';
import { contextOf } from '@/lib/web/contexts';
import { route } from '@/lib/web/route';

export const GET = route({ auth: 'user' }, ({ user, params }) => openBoat(contextOf(user), params.boatId ?? ''));

export const PATCH = route({ auth: 'user', body: boatRenameSchema }, ({ user, params, body }) =>
  renameBoat(contextOf(user), params.boatId ?? '', body.name),
);

/** Hides; can be undone for 30 days. */
export const DELETE = route({ auth: 'user' }, ({ user, params }) => hideBoat(contextOf(user), params.boatId ?? ''));
