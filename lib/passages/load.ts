import { lengthOf, subtract } from '@/lib/geo/vector';
import type { CheckState } from '@/lib/passages/passage';
import type { PreparedBoat } from '@/lib/passages/prepared-boat';
import type { Course } from '@/lib/passages/sail-heading';
import type { WindOverWater } from '@/lib/passages/wind-over-water';
import type { Reef } from '@/lib/rigging/craft';
import { equilibriumHeel } from '@/lib/rigging/equilibrium-heel';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import type { Degrees, Knots, NewtonMetres } from '@/lib/units/quantities';

/** Deeper than this a shunt or a round-up passes through beam-on with no way on. docs/model.md §3. */
export const AT_REST_COUNTS_OVER_DEG = 120;

/** Moments of one instant with one reef. */
export interface Load {
  /** Upright heeling moment in the gust over upright righting moment; the larger of course and at rest. */
  readonly loadShare: number;
  /** Beam-on at rest, at wind angles over 120° or when she is stopped; else null. */
  readonly atRestShare: number | null;
  readonly heelingNm: NewtonMetres;
  readonly rightingNm: NewtonMetres;
  /** Null without the curve, or where no heel balances. */
  readonly heelDeg: Degrees | null;
  readonly serves: boolean;
  readonly carryExceeded: boolean;
  readonly state: Exclude<CheckState, 'unknown'>;
}

interface Winds {
  /** Over the ground, as forecast. */
  readonly meanKn: Knots;
  readonly gustKn: Knots;
}

/**
 * Holds one reef against one instant: load share, whether the reef serves (docs/model.md §4) and the state by §3.
 * `course` is null where she is stopped: then beam-on at rest is all there is. A carry-up-to is compared with the
 * stronger of the wind over the ground and over the water, so that a stream never makes a reef look kinder.
 */
export function loadOf(
  prepared: PreparedBoat,
  reef: Reef,
  course: Course | null,
  water: WindOverWater,
  ground: Winds,
): Load {
  const { boat, uprightRightingNm, curve } = prepared;
  const onCourseNm = course
    ? uprightHeelingMomentNm(boat, reef, lengthOf(subtract(water.gustKn, course.throughWaterKn)))
    : 0;
  const restCounts = !course || Math.abs(course.windAngleDeg) > AT_REST_COUNTS_OVER_DEG + 1e-9;
  const atRestNm = restCounts ? uprightHeelingMomentNm(boat, reef, lengthOf(water.gustKn)) : null;
  const heelingNm = Math.max(onCourseNm, atRestNm ?? 0);
  const withMarginNm = boat.workingMargin * heelingNm;
  const carryExceeded =
    exceeds(Math.max(ground.meanKn, water.meanKn), reef.carryUpToMeanKn) ||
    exceeds(Math.max(ground.gustKn, lengthOf(water.gustKn)), reef.carryUpToGustKn);
  const balance = curve ? equilibriumHeel(curve, heelingNm) : null;
  const falls = heelingNm > uprightRightingNm || (curve !== null && balance === null);
  const thin = withMarginNm > uprightRightingNm || carryExceeded || (balance?.pastLiftOff ?? false);
  return {
    loadShare: heelingNm / uprightRightingNm,
    atRestShare: atRestNm === null ? null : atRestNm / uprightRightingNm,
    heelingNm,
    rightingNm: uprightRightingNm,
    heelDeg: balance ? balance.heelDeg : null,
    serves: !carryExceeded && withMarginNm <= uprightRightingNm,
    carryExceeded,
    state: falls ? 'beyond' : thin ? 'thin' : 'within',
  };
}

function exceeds(windKn: Knots, limitKn: Knots | undefined): boolean {
  return limitKn !== undefined && windKn > limitKn;
}
