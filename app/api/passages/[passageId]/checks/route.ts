import { listPassageChecks } from '@/lib/usecases/passages/list-passage-checks';
import { contextOf } from '@/lib/web/contexts';
import { route } from '@/lib/web/route';

export const GET = route({ auth: 'user' }, async ({ user, params }) => ({
  checks: await listPassageChecks(contextOf(user), params.passageId ?? ''),
}));
