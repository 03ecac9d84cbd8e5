import { signedDeg } from '@/lib/geo/angles';
import { add, vectorToward, type Vector } from '@/lib/geo/vector';
import type { Boat } from '@/lib/passages/passage';
import type { WindOverWater } from '@/lib/passages/wind-over-water';
import { polarSpeedKn } from '@/lib/polars/boat-speed';
import { leewayDegAt } from '@/lib/polars/leeway';
import type { Reef } from '@/lib/rigging/craft';
import type { Degrees, Knots, TrueDegrees } from '@/lib/units/quantities';

/** Everything that fixes how she goes on a heading, apart from the heading. */
export interface SailingConditions {
  readonly boat: Boat;
  readonly reef: Reef;
  readonly wind: WindOverWater;
  readonly streamKn: Vector;
}

/** How she goes on one heading. */
export interface Course {
  readonly headingDeg: TrueDegrees;
  /** Of the heading: positive with the wind on starboard, −180 < x ≤ 180. */
  readonly windAngleDeg: Degrees;
  readonly boatKn: Knots;
  readonly throughWaterKn: Vector;
  readonly overGroundKn: Vector;
}

/**
 * Speed and track on a heading. The polar is read at the angle of the heading; leeway turns the water track
 * further off the wind. Outside the polar's angles the nearest angle's speed is used, so that a search over
 * headings meets no cliff: whoever uses the result must hold the angle to the polar's own range.
 */
export function sailHeading(headingDeg: TrueDegrees, { boat, reef, wind, streamKn }: SailingConditions): Course {
  const windAngleDeg = signedDeg(wind.fromDeg - headingDeg);
  const angle = Math.abs(windAngleDeg);
  const angles = boat.polar.windAnglesDeg;
  const inside = Math.min(Math.max(angle, angles[0]!), angles[angles.length - 1]!);
  const boatKn = polarSpeedKn(boat.polar, wind.meanKn, inside) * reef.speedFactor;
  const leeway = leewayDegAt(boat.leewayDeg, angle);
  const trackDeg = headingDeg - (windAngleDeg < 0 ? -leeway : leeway);
  const throughWaterKn = vectorToward(trackDeg, boatKn);
  return { headingDeg, windAngleDeg, boatKn, throughWaterKn, overGroundKn: add(throughWaterKn, streamKn) };
}
