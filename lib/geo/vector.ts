import type { Degrees, TrueDegrees } from '@/lib/units/quantities';
import { DEG_PER_RAD, RAD_PER_DEG } from '@/lib/units/constants';

/** A velocity or a displacement in the horizontal plane, any unit; both parts in the same one. */
export interface Vector {
  readonly east: number;
  readonly north: number;
}

export const NO_VECTOR: Vector = { east: 0, north: 0 };

/** The vector of a given length pointing toward a true direction. */
export function vectorToward(directionDeg: TrueDegrees, length: number): Vector {
  const angle = directionDeg * RAD_PER_DEG;
  return { east: length * Math.sin(angle), north: length * Math.cos(angle) };
}

/** The vector of a wind that blows FROM a true direction. */
export function vectorFrom(directionDeg: TrueDegrees, length: number): Vector {
  return vectorToward(directionDeg + 180, length);
}

export function add(a: Vector, b: Vector): Vector {
  return { east: a.east + b.east, north: a.north + b.north };
}

export function subtract(a: Vector, b: Vector): Vector {
  return { east: a.east - b.east, north: a.north - b.north };
}

export function scale(a: Vector, factor: number): Vector {
  return { east: a.east * factor, north: a.north * factor };
}

export function lengthOf(a: Vector): number {
  return Math.hypot(a.east, a.north);
}

/** a·b */
export function dot(a: Vector, b: Vector): number {
  return a.east * b.east + a.north * b.north;
}

/** Positive where b lies to starboard of a (clockwise seen from above). */
export function crossToStarboard(a: Vector, b: Vector): number {
  return a.north * b.east - a.east * b.north;
}

/** True direction a vector points toward, 0 ≤ x < 360; 0 for the zero vector. */
export function directionOf(a: Vector): TrueDegrees {
  const angle: Degrees = Math.atan2(a.east, a.north) * DEG_PER_RAD;
  return (angle + 360) % 360;
}

/** True direction a wind vector comes from. */
export function directionFrom(a: Vector): TrueDegrees {
  return (directionOf(a) + 180) % 360;
}
