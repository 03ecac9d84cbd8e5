import type { Boat } from '@/lib/passages/passage';
import { bestAngleDown, bestAngleUp, DEEPEST_BY_RECKONING_DEG } from '@/lib/polars/best-angles';
import type { Degrees, Knots } from '@/lib/units/quantities';

export interface BoardAngles {
  readonly closestDeg: Degrees;
  readonly deepestDeg: Degrees;
}

/** The owner's closest and deepest angles where given; else the angles of best speed made good up and down the wind. */
export function boardAngles(boat: Boat, windKn: Knots): BoardAngles {
  return {
    closestDeg: boat.closestAngleDeg ?? bestAngleUp(boat.polar, windKn).angleDeg,
    deepestDeg: boat.deepestAngleDeg ?? bestAngleDown(boat.polar, windKn, DEEPEST_BY_RECKONING_DEG).angleDeg,
  };
}
