import type { Polar } from '@/lib/polars/polar';
import type { Degrees, Knots } from '@/lib/units/quantities';

/**
 * Boat speed through the water by wind over the water and the true wind angle of the heading, 0–180 (its sign, the
 * side, does not matter). Bilinear between the knots of the table, linearly to zero below its lowest wind, constant
 * beyond its highest, zero outside its lowest and highest angles. Source: docs/model.md §5.
 */
export function polarSpeedKn(polar: Polar, windKn: Knots, angleDeg: Degrees): Knots {
  const angle = bracket(polar.windAnglesDeg, Math.abs(angleDeg));
  const lowestWind = polar.windSpeedsKn[0];
  const highestWind = polar.windSpeedsKn[polar.windSpeedsKn.length - 1];
  if (!angle || lowestWind === undefined || highestWind === undefined || !(windKn > 0)) return 0;

  if (windKn < lowestWind) return speedInRow(polar, 0, angle) * (windKn / lowestWind);
  const wind = bracket(polar.windSpeedsKn, Math.min(windKn, highestWind))!;
  const lower = speedInRow(polar, wind.index, angle);
  const upper = wind.share > 0 ? speedInRow(polar, wind.index + 1, angle) : lower;
  return lower + (upper - lower) * wind.share;
}

interface Bracket {
  readonly index: number;
  /** 0 at the knot `index`, toward 1 at the next one. */
  readonly share: number;
}

/** Where a value lies among ascending knots; null outside them. */
function bracket(knots: readonly number[], value: number): Bracket | null {
  const last = knots.length - 1;
  if (last < 0 || !(value >= knots[0]! && value <= knots[last]!)) return null;
  let index = 0;
  while (index < last && knots[index + 1]! <= value) index += 1;
  if (index === last) return { index, share: 0 };
  return { index, share: (value - knots[index]!) / (knots[index + 1]! - knots[index]!) };
}

function speedInRow(polar: Polar, row: number, angle: Bracket): Knots {
  const speeds = polar.speedsKn[row]!;
  const lower = speeds[angle.index]!;
  return angle.share > 0 ? lower + (speeds[angle.index + 1]! - lower) * angle.share : lower;
}
