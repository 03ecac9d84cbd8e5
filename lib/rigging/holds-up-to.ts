import type { Craft, Reef } from '@/lib/rigging/craft';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import { firstReachOfZero } from '@/lib/rigging/first-root';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import type { Degrees, Knots, NewtonMetres } from '@/lib/units/quantities';

/** Boat speed of the mean wind with the reef in question, through the water. */
export type SpeedKnAt = (windKn: Knots, angleDeg: Degrees) => Knots;

export interface HoldsAtAngle {
  readonly angleDeg: Degrees;
  /** What counts: on the course, and over 120° beam-on at rest too. */
  readonly kn: Knots;
  /** On the course alone. */
  readonly onCourseKn: Knots;
}

export interface HoldsUpTo {
  readonly worstKn: Knots;
  readonly worstAngleDeg: Degrees;
  readonly byAngle: readonly HoldsAtAngle[];
}

/** No answer is over this: a reef that holds more says 120. */
export const HOLDS_UP_TO_CAP_KN: Knots = 120;
/** Deeper than this a shunt or a round-up passes through beam-on with no way on. */
const AT_REST_COUNTS_OVER_DEG: Degrees = 120;
const SEARCH_STEP_KN: Knots = 0.5;

/**
 * The mean wind over the water up to which a reef holds, 0–120 kn: k·HM0 = RM0, its gust being mean × gust factor
 * and the boat's speed that of the mean. At the worst of the given true wind angles, and at each. The least wind that
 * is too much counts, even where a faster boat would find a stronger one easier again. 0 where nothing rights her.
 * It is the wind at the centre of effort, without stream or leeway.
 * Source: docs/model.md §§3–4.
 * @throws RangeError without any angle.
 */
export function holdsUpToKn(craft: Craft, reef: Reef, speedKnAt: SpeedKnAt, anglesDeg: readonly Degrees[]): HoldsUpTo {
  const atRestKn = leastTooMuchKn(craft, reef, 90, () => 0);
  const byAngle = anglesDeg.map((angleDeg) => {
    const onCourseKn = leastTooMuchKn(craft, reef, angleDeg, speedKnAt);
    const atRestCounts = Math.abs(angleDeg) > AT_REST_COUNTS_OVER_DEG;
    return { angleDeg, onCourseKn, kn: atRestCounts ? Math.min(onCourseKn, atRestKn) : onCourseKn };
  });
  const first = byAngle[0];
  if (!first) throw new RangeError('Give at least one wind angle.');
  const worst = byAngle.reduce((least, row) => (row.kn < least.kn ? row : least), first);
  return { worstKn: worst.kn, worstAngleDeg: worst.angleDeg, byAngle };
}

function leastTooMuchKn(craft: Craft, reef: Reef, angleDeg: Degrees, speedKnAt: SpeedKnAt): Knots {
  const rightingNm: NewtonMetres = uprightRightingMomentNm(sumMasses(craft.masses));
  if (rightingNm <= 0) return 0;
  const excessNm = (meanKn: Knots) => {
    const gust = apparentWind(meanKn * craft.gustFactor, angleDeg, speedKnAt(meanKn, angleDeg));
    return craft.workingMargin * uprightHeelingMomentNm(craft, reef, gust.speedKn) - rightingNm;
  };
  return firstReachOfZero(excessNm, 0, HOLDS_UP_TO_CAP_KN, SEARCH_STEP_KN) ?? HOLDS_UP_TO_CAP_KN;
}
