import type { Boat } from '@/lib/passages/passage';
import { DEEPEST_BY_RECKONING_DEG } from '@/lib/polars/best-angles';
import { polarSpeedKn } from '@/lib/polars/boat-speed';
import type { Reef } from '@/lib/rigging/craft';
import { holdsUpToKn, type HoldsUpTo } from '@/lib/rigging/holds-up-to';
import type { Degrees } from '@/lib/units/quantities';

const STEP_DEG: Degrees = 5;

/**
 * What a reef holds up to at every angle that she sails, closest to deepest, in steps of 5° with the polar's own
 * angles between. Without the owner's angles: from the polar's lowest to its highest, at most 150°. docs/model.md §4.
 */
export function reefHolds(boat: Boat, reef: Reef): HoldsUpTo {
  const speedKnAt = (windKn: number, angleDeg: number) => polarSpeedKn(boat.polar, windKn, angleDeg) * reef.speedFactor;
  return holdsUpToKn(boat, reef, speedKnAt, sailedAnglesDeg(boat));
}

/** The angles that she sails, ascending. */
export function sailedAnglesDeg(boat: Boat): readonly Degrees[] {
  const angles = boat.polar.windAnglesDeg;
  const lowest = angles[0]!;
  const highest = angles[angles.length - 1]!;
  const closest = boat.closestAngleDeg ?? lowest;
  const deepest = Math.max(closest, boat.deepestAngleDeg ?? Math.min(highest, DEEPEST_BY_RECKONING_DEG));
  const steps = Array.from({ length: 180 / STEP_DEG + 1 }, (_, index) => index * STEP_DEG);
  const inside = [...steps, ...angles].filter((angle) => angle > closest && angle < deepest);
  return [...new Set([closest, ...inside, deepest])].sort((a, b) => a - b);
}
