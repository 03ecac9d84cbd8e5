import { passageSaveSchema } from '@/lib/schemas/passage-requests';
import { hidePassage } from '@/lib/usecases/passages/hide-passage';
import { openPassage } from '@/lib/usecases/passages/open-passage';
import { savePassage } from '@/lib/usecases/passages/save-passage';
import { contextOf } from '@/lib/web/contexts';
import { landForChecks } from '@/lib/web/land';
import { route } from '@/lib/web/route';

export const GET = route({ auth: 'user' }, ({ user, params }) => openPassage(contextOf(user), params.passageId ?? ''));

/** Saves a plan as a new revision and stores its check. */
export const PUT = route({ auth: 'user', body: passageSaveSchema }, async ({ user, params, body }) => {
  const land = await landForChecks();
  const context = { ...contextOf(user), ...(land ? { land } : {}) };
  return savePassage(context, params.passageId ?? '', body.plan, body.basedOnRevision);
});

/** Hides; can be undone for 30 days. */
export const DELETE = route({ auth: 'user' }, ({ user, params }) =>
  hidePassage(contextOf(user), params.passageId ?? ''),
);
