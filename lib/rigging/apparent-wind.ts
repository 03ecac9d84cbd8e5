import { DEG_PER_RAD, RAD_PER_DEG } from '@/lib/units/constants';
import type { Degrees, Knots } from '@/lib/units/quantities';

/**
 * Apparent wind = wind over the water less the boat's velocity through the water. `twaDeg` counts from the
 * direction in which she moves through the water, and its sign (the side) is kept. For a gust give the gust's speed
 * and the boat's speed of the mean wind. Dead ahead of no wind at all the angle is 0. Source: docs/model.md §3; the
 * wind triangle of The American Practical Navigator (Pub. No. 9).
 */
export function apparentWind(twsKn: Knots, twaDeg: Degrees, boatKn: Knots): { speedKn: Knots; angleDeg: Degrees } {
  const ahead = twsKn * Math.cos(twaDeg * RAD_PER_DEG) + boatKn;
  const abeam = twsKn * Math.sin(twaDeg * RAD_PER_DEG);
  return { speedKn: Math.hypot(ahead, abeam), angleDeg: Math.atan2(abeam, ahead) * DEG_PER_RAD };
}
