import type { LandIndex } from '@/lib/geo/land';
import { checkPassage } from '@/lib/passage-check/check-passage';
import type { CheckResult } from '@/lib/passages/passage';
import type { CheckRequest } from '@/lib/schemas/check-request';
import { requestToPassage } from '@/lib/schemas/to-passage';

/** A check of what is sent, stored nowhere. Open to whoever is signed in: it touches nobody's records. */
export function computeCheck(request: CheckRequest, world: { now: Date; land: LandIndex | undefined }): CheckResult {
  return checkPassage(requestToPassage(request, world.now.getTime()), { land: world.land });
}
