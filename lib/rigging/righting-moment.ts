import type { MassSums } from '@/lib/rigging/sum-masses';
import { GRAVITY_M_S2 } from '@/lib/units/constants';
import type { NewtonMetres } from '@/lib/units/quantities';

/**
 * The trade's righting moment by hand, RM0 = g·Sy: lever upright, about the vaka's centre of buoyancy, at the
 * instant the ama leaves the water. The peak of the real curve is lower. Source: docs/model.md §2.
 */
export function uprightRightingMomentNm(sums: MassSums): NewtonMetres {
  return GRAVITY_M_S2 * sums.momentYKgM;
}
