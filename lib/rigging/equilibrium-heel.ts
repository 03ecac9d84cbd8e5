import { bisect, firstReachOfZero } from '@/lib/rigging/first-root';
import { heelingMomentNmAtHeel } from '@/lib/rigging/heeling-moment';
import type { RightingCurve } from '@/lib/rigging/righting-curve';
import type { Degrees, NewtonMetres } from '@/lib/units/quantities';

export interface EquilibriumHeel {
  readonly heelDeg: Degrees;
  /** The ama is in the air, or she lies on her pod: never an improvement. */
  readonly pastLiftOff: boolean;
}

const SEARCH_STEP_DEG = 0.25;

/**
 * The smallest heel at which HM0·cos²φ = RM(φ), to far under a thousandth of a degree; null where she goes over.
 * A balance that only the pod gives is returned too, with pastLiftOff. Source: docs/model.md §3.
 */
export function equilibriumHeel(
  curve: Pick<RightingCurve, 'liftOffDeg' | 'momentNmAt'>,
  uprightHeelingNm: NewtonMetres,
): EquilibriumHeel | null {
  if (uprightHeelingNm <= 0) return { heelDeg: 0, pastLiftOff: false };
  const surplusNm = (heelDeg: Degrees) => curve.momentNmAt(heelDeg) - heelingMomentNmAtHeel(uprightHeelingNm, heelDeg);

  // Up to lift-off RM only rises and HM only falls, so there is one crossing at most.
  if (surplusNm(curve.liftOffDeg) >= 0) {
    return { heelDeg: bisect(surplusNm, 0, curve.liftOffDeg), pastLiftOff: false };
  }
  const heelDeg = firstReachOfZero(surplusNm, curve.liftOffDeg, 90, SEARCH_STEP_DEG);
  return heelDeg === null ? null : { heelDeg, pastLiftOff: true };
}
