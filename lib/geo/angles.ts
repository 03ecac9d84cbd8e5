import type { Degrees, TrueDegrees } from '@/lib/units/quantities';

/** A direction brought into 0 ≤ x < 360 degrees. */
export function normaliseDeg(deg: number): TrueDegrees {
  const turned = deg % 360;
  const positive = turned < 0 ? turned + 360 : turned;
  // A tiny negative angle plus 360 rounds to 360 itself; adding zero turns -0 into 0.
  return positive >= 360 ? 0 : positive + 0;
}

/** A turn brought into -180 < x ≤ 180 degrees, positive clockwise. */
export function signedDeg(deg: number): Degrees {
  const turned: number = normaliseDeg(deg);
  return turned > 180 ? turned - 360 : turned;
}
