import { amaLoadAtRestKg } from '@/lib/rigging/ama-load';
import type { Craft } from '@/lib/rigging/craft';
import { firstReachOfZero } from '@/lib/rigging/first-root';
import { podBalance, podTouchdownDeg } from '@/lib/rigging/lee-pod';
import { momentAfterLiftOffNm } from '@/lib/rigging/moment-after-lift-off';
import { pointHeightOverWaterM } from '@/lib/rigging/point-height';
import { sumMasses } from '@/lib/rigging/sum-masses';
import { vakaWaterplane } from '@/lib/rigging/vaka-waterplane';
import { DEG_PER_RAD, SEA_WATER_KG_M3 } from '@/lib/units/constants';
import type { Degrees, Metres, NewtonMetres } from '@/lib/units/quantities';

export interface RightingCurve {
  /** Heel at which the ama leaves the water, and the peak of the curve until the pod comes in. */
  readonly liftOffDeg: Degrees;
  readonly liftOffMomentNm: NewtonMetres;
  readonly amaImmersionAtRestM: Metres;
  readonly sinkageAtLiftOffM: Metres;
  /** BM, from the vaka's centre of buoyancy up to the metacentre. */
  readonly metacentricRadiusM: Metres;
  /** Heel at which the lee pod's bottom meets the water; null without a pod. */
  readonly touchdownDeg: Degrees | null;
  /** First heel past the peak where nothing rights her any more, pod counted; null if there is none up to 90°. */
  readonly vanishingDeg: Degrees | null;
  /** Heel 0–90° to leeward, the ama rising. */
  momentNmAt(heelDeg: Degrees): NewtonMetres;
  /** Height of the ama's bottom over the water; negative is under it. */
  amaHeightMAt(heelDeg: Degrees): Metres;
  podImmersionMAt(heelDeg: Degrees): Metres;
}

const SEARCH_STEP_DEG = 0.25;

/**
 * The righting curve by heel: linear to lift-off, then the tilted weights about the metacentre and the pod.
 * Null without the vaka's measures or the ama's waterplane area, or where the masses have no moment toward the ama.
 * Flat water, no way on, wall-sided hulls: what waves and a bent aka do is not in it. Source: docs/model.md §2.
 */
export function rightingCurve(craft: Craft): RightingCurve | null {
  const { spanM, vaka, pod } = craft;
  const amaWaterplaneM2 = craft.ama?.waterplaneM2;
  const sums = sumMasses(craft.masses);
  if (!vaka || amaWaterplaneM2 === undefined || !(sums.momentYKgM > 0)) return null;

  const { areaM2, metacentricRadiusM } = vakaWaterplane(vaka, sums.massKg);
  const metacentreHeightM = vaka.buoyancyHeightM + metacentricRadiusM;
  const amaLoadKg = amaLoadAtRestKg(sums, spanM);
  const amaImmersionAtRestM = amaLoadKg / (SEA_WATER_KG_M3 * amaWaterplaneM2);
  const sinkageAtLiftOffM = amaLoadKg / (SEA_WATER_KG_M3 * areaM2);
  const liftOffDeg = Math.atan((amaImmersionAtRestM + sinkageAtLiftOffM) / spanM) * DEG_PER_RAD;

  const podAt = (heelDeg: Degrees) =>
    podBalance(pod, heelDeg, sinkageAtLiftOffM * Math.min(1, heelDeg / liftOffDeg), areaM2);
  const flyingMomentNm = (heelDeg: Degrees) =>
    momentAfterLiftOffNm(sums, heelDeg, metacentreHeightM) + podAt(heelDeg).momentNm;
  const liftOffMomentNm = flyingMomentNm(liftOffDeg);

  return {
    liftOffDeg,
    liftOffMomentNm,
    amaImmersionAtRestM,
    sinkageAtLiftOffM,
    metacentricRadiusM,
    touchdownDeg: pod ? podTouchdownDeg(pod, sinkageAtLiftOffM) : null,
    vanishingDeg: firstReachOfZero((heelDeg) => -flyingMomentNm(heelDeg), liftOffDeg, 90, SEARCH_STEP_DEG),
    momentNmAt: (heelDeg) =>
      heelDeg < liftOffDeg ? (liftOffMomentNm * heelDeg) / liftOffDeg : flyingMomentNm(heelDeg),
    amaHeightMAt: (heelDeg) => pointHeightOverWaterM(spanM, heelDeg, amaImmersionAtRestM + podAt(heelDeg).sinkageM),
    podImmersionMAt: (heelDeg) => podAt(heelDeg).immersionM,
  };
}
