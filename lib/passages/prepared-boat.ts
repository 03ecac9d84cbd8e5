import type { Boat } from '@/lib/passages/passage';
import { abackLimitKn } from '@/lib/rigging/aback';
import { rightingCurve, type RightingCurve } from '@/lib/rigging/righting-curve';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { sumMasses } from '@/lib/rigging/sum-masses';
import type { Knots, NewtonMetres } from '@/lib/units/quantities';

/** What stays the same all along a passage, worked once. */
export interface PreparedBoat {
  readonly boat: Boat;
  readonly uprightRightingNm: NewtonMetres;
  /** Null without the measures it needs. */
  readonly curve: RightingCurve | null;
  /** By reef; null where the ama's volume is not known. */
  readonly abackLimitsKn: readonly (Knots | null)[];
}

export function prepareBoat(boat: Boat): PreparedBoat {
  return {
    boat,
    uprightRightingNm: uprightRightingMomentNm(sumMasses(boat.masses)),
    curve: rightingCurve(boat),
    abackLimitsKn: boat.reefs.map((reef) => abackLimitKn(boat, reef)),
  };
}
