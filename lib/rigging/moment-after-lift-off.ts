import type { MassSums } from '@/lib/rigging/sum-masses';
import { GRAVITY_M_S2, RAD_PER_DEG } from '@/lib/units/constants';
import type { Degrees, Metres, NewtonMetres } from '@/lib/units/quantities';

/**
 * Righting moment with the ama in the air and the lee pod still dry:
 * g·[Sy·cosφ − (Sz − M·zB)·sinφ + M·BM·sinφ]. The metacentre, about which she turns, is at zB + BM over the
 * waterline. Source: statics of a heeled hull, docs/model.md §2.
 */
export function momentAfterLiftOffNm(sums: MassSums, heelDeg: Degrees, metacentreHeightM: Metres): NewtonMetres {
  const heel = heelDeg * RAD_PER_DEG;
  const overMetacentreKgM = sums.momentZKgM - sums.massKg * metacentreHeightM;
  return GRAVITY_M_S2 * (sums.momentYKgM * Math.cos(heel) - overMetacentreKgM * Math.sin(heel));
}
