/** Straight pieces in a plane, kept flat for speed: piece i runs from (x1, y1) to (x2, y2), any one unit. */
export interface Segments {
  readonly count: number;
  readonly x1: Float64Array;
  readonly y1: Float64Array;
  readonly x2: Float64Array;
  readonly y2: Float64Array;
}

/** Squared distance from a point to piece i, in the unit of the plane squared. */
export function squaredDistanceTo(segments: Segments, i: number, x: number, y: number): number {
  const ax = segments.x1[i]!;
  const ay = segments.y1[i]!;
  const dx = segments.x2[i]! - ax;
  const dy = segments.y2[i]! - ay;
  const lengthSq = dx * dx + dy * dy;
  const along = lengthSq > 0 ? Math.min(1, Math.max(0, ((x - ax) * dx + (y - ay) * dy) / lengthSq)) : 0;
  return (x - ax - along * dx) ** 2 + (y - ay - along * dy) ** 2;
}

/** Does a ray from the point toward +x cross piece i? Half open in y, so that a shared end counts once. */
export function crossesRayEast(segments: Segments, i: number, x: number, y: number): boolean {
  const ay = segments.y1[i]!;
  const by = segments.y2[i]!;
  if (ay > y === by > y) return false;
  const ax = segments.x1[i]!;
  return ax + ((y - ay) / (by - ay)) * (segments.x2[i]! - ax) > x;
}

/**
 * Where along a line from (ax, ay) to (bx, by) piece i is first met: 0 at its start, 1 at its end, null where it
 * is not met. Touching counts.
 */
export function meetsAt(segments: Segments, i: number, ax: number, ay: number, bx: number, by: number): number | null {
  const dx = bx - ax;
  const dy = by - ay;
  const ex = segments.x2[i]! - segments.x1[i]!;
  const ey = segments.y2[i]! - segments.y1[i]!;
  const fx = segments.x1[i]! - ax;
  const fy = segments.y1[i]! - ay;
  const turn = dx * ey - dy * ex;
  if (turn !== 0) {
    const along = (fx * ey - fy * ex) / turn;
    const across = (fx * dy - fy * dx) / turn;
    return along >= 0 && along <= 1 && across >= 0 && across <= 1 ? along : null;
  }
  // Parallel: they meet only where they lie on one line and overlap.
  const lengthSq = dx * dx + dy * dy;
  if (lengthSq === 0 || fx * dy - fy * dx !== 0) return null;
  const one = (fx * dx + fy * dy) / lengthSq;
  const other = one + (ex * dx + ey * dy) / lengthSq;
  const first = Math.max(0, Math.min(one, other));
  return first <= Math.min(1, Math.max(one, other)) ? first : null;
}
