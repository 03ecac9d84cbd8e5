import { findBoatSheet } from '@/db/read-models/boat-sheets';
import { findLatestCheck, type StoredCheck } from '@/db/read-models/passage-checks';
import { insertAuditEvent } from '@/db/stores/audit-store';
import { keepForecast } from '@/db/stores/forecast-store';
import { insertPassageCheck } from '@/db/stores/passage-check-store';
import { lockPassage, updatePassage } from '@/db/stores/passage-store';
import { ConflictError, NotFoundError } from '@/lib/errors';
import type { LandIndex } from '@/lib/geo/land';
import { checkPassage } from '@/lib/passage-check/check-passage';
import { worstLegIndex } from '@/lib/passage-check/describe';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { planToPassage } from '@/lib/schemas/to-passage';
import type { Context } from '@/lib/usecases/context';
import { requirePassage } from '@/lib/usecases/passages/require-passage';

export interface SavedPassage {
  readonly revision: number;
  readonly check: StoredCheck;
}

/**
 * Saves a plan as a new revision, checks it with the newest version of the boat sheet and stores the check,
 * pinned to that version. Throws ConflictError where somebody saved since the revision it is based on.
 */
export async function savePassage(
  context: Context & { readonly land?: LandIndex },
  passageId: string,
  plan: PassagePlan,
  basedOnRevision: number,
): Promise<SavedPassage> {
  const { user, now, land } = context;
  const { boatId } = await requirePassage(context, passageId, 'write-passage');
  return context.db.transaction(async (trx) => {
    const present = await lockPassage(trx, passageId);
    if (present.revision !== basedOnRevision) {
      throw new ConflictError(
        'Somebody saved this passage meanwhile. Your changes are still on this page: open the passage in another window, compare, and put in what is missing.',
      );
    }
    const version = await findBoatSheet(trx, boatId);
    if (!version) throw new NotFoundError("That boat's sheet");
    const revision = present.revision + 1;
    await updatePassage(trx, passageId, revision, plan);
    const forecast = await keepForecast(trx, passageId, plan.wind, user.id);
    const passage = planToPassage(plan, version.sheet, now.getTime());
    const result = checkPassage(passage, land ? { land } : {});
    await insertPassageCheck(trx, {
      passageId,
      passageRevision: revision,
      boatSheetId: version.id,
      forecastId: forecast.id,
      asOf: now,
      inputs: plan,
      result,
      worstLegPosition: worstLegIndex(result.legs),
      checkedBy: user.id,
    });
    await insertAuditEvent(trx, {
      userId: user.id,
      action: 'save-passage',
      subjectId: passageId,
      details: { revision },
    });
    return { revision, check: (await findLatestCheck(trx, passageId))! };
  });
}
