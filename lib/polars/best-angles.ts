import { polarSpeedKn } from '@/lib/polars/boat-speed';
import { largestBetween } from '@/lib/polars/golden-section';
import type { Polar } from '@/lib/polars/polar';
import { RAD_PER_DEG } from '@/lib/units/constants';
import type { Degrees, Knots } from '@/lib/units/quantities';

export interface BestAngle {
  /** True wind angle of the heading, 0–180. */
  readonly angleDeg: Degrees;
  /** Speed made good straight up wind or straight down wind: positive in the wanted direction. */
  readonly vmgKn: Knots;
  readonly speedKn: Knots;
}

/** A wave or a shift must not bring the wind to the wrong side: the deepest angle where the owner gives none. Judgement, no source. */
export const DEEPEST_BY_RECKONING_DEG: Degrees = 150;

/** The angle up to 90° of the best speed made good to windward in this wind. Source: docs/model.md §5. */
export function bestAngleUp(polar: Polar, windKn: Knots): BestAngle {
  return bestAngle(polar, windKn, 0, 90, 1);
}

/** The angle from 90° to the deepest of the best speed made good down wind in this wind. Source: docs/model.md §5. */
export function bestAngleDown(polar: Polar, windKn: Knots, deepestDeg: Degrees = DEEPEST_BY_RECKONING_DEG): BestAngle {
  return bestAngle(polar, windKn, 90, deepestDeg, -1);
}

function bestAngle(polar: Polar, windKn: Knots, fromDeg: Degrees, toDeg: Degrees, sign: 1 | -1): BestAngle {
  const angles = polar.windAnglesDeg;
  const within = (deg: number) => Math.min(Math.max(deg, angles[0] ?? fromDeg), angles[angles.length - 1] ?? toDeg);
  const low = within(fromDeg);
  const high = Math.max(low, within(toDeg));

  // Below the lowest wind all speeds shrink alike, so the best angle is that of the lowest wind, down to a calm.
  const searchKn = Math.max(windKn, polar.windSpeedsKn[0] ?? 0);
  const vmgAt = (deg: number) => sign * polarSpeedKn(polar, searchKn, deg) * Math.cos(deg * RAD_PER_DEG);

  // Speed is linear between two angles of the table, so each such piece has at most one hill.
  const edges = [low, ...angles.filter((deg) => deg > low && deg < high), high];
  const first = sign > 0 ? low : high;
  const angleDeg = edges
    .slice(1)
    .map((edge, piece) => largestBetween(vmgAt, edges[piece]!, edge))
    .reduce((best, deg) => (vmgAt(deg) > vmgAt(best) ? deg : best), first);

  const speedKn = polarSpeedKn(polar, windKn, angleDeg);
  return { angleDeg, speedKn, vmgKn: sign * speedKn * Math.cos(angleDeg * RAD_PER_DEG) };
}
