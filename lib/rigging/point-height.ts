import { RAD_PER_DEG } from '@/lib/units/constants';
import type { Degrees, Metres } from '@/lib/units/quantities';

/**
 * Height over the water of a point that floats at the waterline at rest, a span away from the heeling axis, when
 * she has heeled and the waterline has risen on her by `riseM`: B·sinφ − rise·cosφ. Negative is under water.
 * For the ama's bottom the rise is its own immersion at rest and the vaka's sinkage. Source: docs/model.md §2.
 */
export function pointHeightOverWaterM(spanM: Metres, heelDeg: Degrees, riseM: Metres): Metres {
  const heel = heelDeg * RAD_PER_DEG;
  return spanM * Math.sin(heel) - riseM * Math.cos(heel);
}
