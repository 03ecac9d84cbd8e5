import { rhumbDirect } from '@/lib/geo/rhumb';
import { directionOf, lengthOf, type Vector } from '@/lib/geo/vector';
import type { Decision } from '@/lib/passages/decide';
import type { Place, Sailing } from '@/lib/passages/sailing';
import { M_S_PER_KNOT } from '@/lib/units/constants';
import type { Knots } from '@/lib/units/quantities';

/** One step as planned, before it is sailed. */
export interface Step {
  readonly ms: number;
  readonly overGroundKn: Vector;
  readonly throughWaterKn: Knots;
  /** Toward the target; on boards by the pair of them. */
  readonly madeGoodKn: Knots;
  readonly arrives: boolean;
  /** Ends in a turn or at the waypoint. */
  readonly event: boolean;
}

/** Where a velocity over the ground leaves her after some milliseconds, along a rhumb line. */
export function moved(place: Place, overGroundKn: Vector, ms: number): Place {
  const distanceM = (lengthOf(overGroundKn) * M_S_PER_KNOT * ms) / 1000;
  return distanceM === 0 ? place : rhumbDirect(place, directionOf(overGroundKn), distanceM);
}

/** The same mode on the same end. */
export function sameWay(a: Sailing, b: Sailing): boolean {
  return a.mode === b.mode && a.end === b.end;
}

/** The same reef too. */
export function sameDecision(a: Decision, b: Decision): boolean {
  return a.reefIndex === b.reefIndex && sameWay(a.sailing, b.sailing);
}
