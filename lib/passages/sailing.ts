import { signedDeg } from '@/lib/geo/angles';
import { mercatorOffsetM } from '@/lib/geo/mercator';
import { rhumbInverse } from '@/lib/geo/rhumb';
import { add, crossToStarboard, dot, scale, vectorFrom, vectorToward, type Vector } from '@/lib/geo/vector';
import { boardAngles } from '@/lib/passages/board-angles';
import { makeGood } from '@/lib/passages/make-good';
import { sailHeading, type Course, type SailingConditions } from '@/lib/passages/sail-heading';
import { M_S_PER_KNOT } from '@/lib/units/constants';
import type { Degrees, TrueDegrees } from '@/lib/units/quantities';

/** A: the wind on the port hand of the direction of travel. B: on starboard. */
export type End = 'A' | 'B';

export interface Place {
  readonly lat: number;
  readonly lon: number;
}

/** How she goes on at an instant toward a target, on the end she has or on the other. */
export type Sailing =
  | { readonly mode: 'direct'; readonly end: End; readonly course: Course }
  | {
      readonly mode: 'boards';
      readonly end: End;
      readonly course: Course;
      readonly other: Course;
      /** Speed toward the target of the pair of boards, shunts left out, kn. */
      readonly pairKn: number;
    }
  | { readonly mode: 'drift'; readonly end: End | null; readonly course: null };

/** Slack at the edge of the sailable angles: arithmetic and a metre of drift, not pinching. */
const EDGE_DEG = 0.01;
const MOVING_KN = 1e-3;

/** Where a shunt leaves her: drift down the water wind at her own speed, and with the stream, for its whole time. */
export function shuntDisplacementM({ boat, wind, streamKn }: SailingConditions): Vector {
  const driftKn = scale(vectorFrom(wind.fromDeg, 1), wind.meanKn > 0 ? boat.shunt.driftKn : 0);
  return scale(add(driftKn, streamKn), boat.shunt.seconds * M_S_PER_KNOT);
}

/**
 * Direct where the heading that makes good the target lies between her closest and deepest angles; else boards;
 * drifting where neither makes good anything. `present` is the end she leads with now, null before the departure.
 * Where direct asks for the other end, it must still hold from where the shunt leaves her. docs/model.md §6.
 */
export function sailingToward(
  place: Place,
  target: Place,
  present: End | null,
  conditions: SailingConditions,
): Sailing {
  const angles = boardAngles(conditions.boat, conditions.wind.meanKn);
  const bearing = rhumbInverse(place, target).courseDeg;
  const direct = makeGood(bearing, conditions);
  const sailable = direct !== null && isSailable(direct, angles);
  if (direct && sailable) {
    const end = endOf(direct);
    const stays = present === null || end === present;
    if (stays || holdsAfterShunt(place, target, conditions, angles)) return { mode: 'direct', end, course: direct };
  }
  return boardsToward(bearing, direct, sailable, present, conditions, angles);
}

type Angles = ReturnType<typeof boardAngles>;

function isSailable(course: Course, { closestDeg, deepestDeg }: Angles): boolean {
  const angle = Math.abs(course.windAngleDeg);
  return course.boatKn > MOVING_KN && angle >= closestDeg - EDGE_DEG && angle <= deepestDeg + EDGE_DEG;
}

function endOf(course: Course): End {
  return course.windAngleDeg < 0 ? 'A' : 'B';
}

function holdsAfterShunt(place: Place, target: Place, conditions: SailingConditions, angles: Angles): boolean {
  const offset = mercatorOffsetM(place, target);
  const moved = shuntDisplacementM(conditions);
  const left = { east: offset.east - moved.east, north: offset.north - moved.north };
  const bearing = ((Math.atan2(left.east, left.north) * 180) / Math.PI + 360) % 360;
  const course = makeGood(bearing, conditions);
  return course !== null && isSailable(course, angles);
}

function boardsToward(
  bearing: TrueDegrees,
  direct: Course | null,
  directIsSailable: boolean,
  present: End | null,
  conditions: SailingConditions,
  { closestDeg, deepestDeg }: Angles,
): Sailing {
  const wanted = Math.abs(direct ? direct.windAngleDeg : signedDeg(conditions.wind.fromDeg - bearing));
  const upwind = wanted < (closestDeg + deepestDeg) / 2;
  const angle = upwind ? closestDeg : deepestDeg;
  const boards = { A: onBoard('A', angle, conditions), B: onBoard('B', angle, conditions) };
  const along = vectorToward(bearing, 1);
  // Between the layline and the one that allows for the shunt's drift the target lies outside the pair's reach, yet
  // she will lay it once she has sailed on a little.
  const pairKn =
    direct && directIsSailable
      ? dot(along, direct.overGroundKn)
      : speedOfPair(along, boards.A.overGroundKn, boards.B.overGroundKn);
  if (boards.A.boatKn <= MOVING_KN || pairKn <= MOVING_KN) return { mode: 'drift', end: present, course: null };
  const betterOnB = dot(along, boards.B.overGroundKn) > dot(along, boards.A.overGroundKn) + 1e-9;
  const end = present ?? (betterOnB ? 'B' : 'A');
  return { mode: 'boards', end, course: boards[end], other: boards[end === 'A' ? 'B' : 'A'], pairKn };
}

function onBoard(end: End, angleDeg: Degrees, conditions: SailingConditions): Course {
  const headingDeg = conditions.wind.fromDeg + (end === 'A' ? angleDeg : -angleDeg);
  return sailHeading(((headingDeg % 360) + 360) % 360, conditions);
}

/** Speed made good along a line by two boards shared so that they end on it; negative infinity where they cannot. */
export function speedOfPair(along: Vector, a: Vector, b: Vector): number {
  const lateralA = crossToStarboard(along, a);
  const lateralB = crossToStarboard(along, b);
  if (lateralA * lateralB >= 0) return Number.NEGATIVE_INFINITY;
  const shareA = Math.abs(lateralB) / (Math.abs(lateralA) + Math.abs(lateralB));
  return dot(along, a) * shareA + dot(along, b) * (1 - shareA);
}
