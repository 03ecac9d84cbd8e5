import Flatbush from 'flatbush';
import { alongRhumb } from '@/lib/geo/along-rhumb';
import type { Box, LandPolygon } from '@/lib/geo/land-file';
import { type LandSegments, layOutLand } from '@/lib/geo/land-segments';
import { parallelRadiusM } from '@/lib/geo/ellipsoid';
import { mercatorOffsetM } from '@/lib/geo/mercator';
import type { Position } from '@/lib/geo/position';
import { crossesRayEast, meetsAt, squaredDistanceTo } from '@/lib/geo/segments';
import { RAD_PER_DEG } from '@/lib/units/constants';
import type { Metres } from '@/lib/units/quantities';

/**
 * Questions about land, answered only inside the box that the data covers. The sample coastline lacks small islets
 * and rocks and is out by about 100 m in places; it holds no depths. It can warn, it can never clear a course.
 */
export interface LandIndex {
  /** Is the place inside the data? Where it is not, nothing is known, whatever the other answers say. */
  covers(point: Position): boolean;
  /** On land. False outside the box: ask `covers` first. */
  isLand(point: Position): boolean;
  /** Where a rhumb line first meets land: its start if that is on land, null where it meets none that is known. */
  crossesLand(a: Position, b: Position): Position | null;
  /**
   * Metres to the nearest known shore, from land as from water; Infinity where there is none. The edges of the box
   * are no shore, so that near them a shore outside, not known, may be nearer. Within 0.1 % up to 10 km.
   */
  distanceToShoreM(point: Position): Metres;
}

/** Long lines are asked about in pieces of this length, so that the first meeting ends the search. */
const PIECE_M = 2000;
const MILLIMETRE_DEG = 1e-8;

/**
 * Builds the index from closed rings, longitude first. They are laid on the ellipsoidal Mercator plane, where rhumb
 * lines are straight, in metres at the scale of the box's middle; the exact questions are then asked of the few
 * pieces that an R-tree finds.
 */
export function buildLandIndex(polygons: readonly LandPolygon[], box: Box): LandIndex {
  const middle: Position = { lat: (box.south + box.north) / 2, lon: (box.west + box.east) / 2 };
  const toPlane = (point: Position) => mercatorOffsetM(middle, point);
  const land = layOutLand(polygons, box, ([lon, lat]) => toPlane({ lat, lon }));
  const tree = buildTree(land);
  const eastEdge = toPlane({ lat: middle.lat, lon: box.east }).east;
  const isCoast = (i: number) => land.isCoast[i] === 1;

  const covers = ({ lat, lon }: Position) => lat >= box.south && lat <= box.north && lon >= box.west && lon <= box.east;

  const isLand = (point: Position) => {
    if (!covers(point) || !tree) return false;
    // A place on the very edge of the box is taken a millimetre inside, where a ray can tell land from water.
    const { east: x, north: y } = toPlane({
      lat: clamp(point.lat, box.south + MILLIMETRE_DEG, box.north - MILLIMETRE_DEG),
      lon: clamp(point.lon, box.west + MILLIMETRE_DEG, box.east - MILLIMETRE_DEG),
    });
    // Counted per polygon, so that two that overlap by a hair do not cancel each other.
    const inside = new Set<number>();
    tree.search(x, y, eastEdge, y, (i) => {
      const polygon = land.polygonOf[i]!;
      if (crossesRayEast(land, i, x, y) && !inside.delete(polygon)) inside.add(polygon);
      return false;
    });
    return inside.size > 0;
  };

  const crossesLand = (a: Position, b: Position) => {
    if (isLand(a)) return { lat: a.lat, lon: a.lon };
    if (!tree) return null;
    const from = toPlane(a);
    const to = toPlane(b);
    const dx = to.east - from.east;
    const dy = to.north - from.north;
    const pieces = Math.max(1, Math.ceil(Math.hypot(dx, dy) / PIECE_M));
    for (let piece = 0; piece < pieces; piece++) {
      const [s, e] = [piece / pieces, (piece + 1) / pieces];
      const [sx, sy, ex, ey] = [from.east + s * dx, from.north + s * dy, from.east + e * dx, from.north + e * dy];
      let first = Infinity;
      tree.search(Math.min(sx, ex), Math.min(sy, ey), Math.max(sx, ex), Math.max(sy, ey), (i) => {
        if (isCoast(i)) first = Math.min(first, meetsAt(land, i, sx, sy, ex, ey) ?? Infinity);
        return false;
      });
      if (first !== Infinity) return alongRhumb(a, b, (piece + first) / pieces);
    }
    return null;
  };

  const distanceToShoreM = (point: Position): Metres => {
    const { east: x, north: y } = toPlane(point);
    let squared = Infinity;
    const consider = (i: number) => {
      squared = Math.min(squared, squaredDistanceTo(land, i, x, y));
      return false;
    };
    // The few nearest boxes bound the distance; everything within that bound is then measured.
    tree?.neighbors(x, y, 4, Infinity, isCoast).forEach(consider);
    if (!tree || squared === Infinity) return Infinity;
    const reach = Math.sqrt(squared);
    tree.search(x - reach, y - reach, x + reach, y + reach, (i) => isCoast(i) && consider(i));
    return Math.sqrt(squared) * groundPerPlane(middle, point.lat);
  };

  return { covers, isLand, crossesLand, distanceToShoreM };
}

function clamp(value: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, value));
}

function buildTree(land: LandSegments): Flatbush | null {
  if (land.count === 0) return null;
  const tree = new Flatbush(land.count);
  for (let i = 0; i < land.count; i++) {
    const [ax, ay, bx, by] = [land.x1[i]!, land.y1[i]!, land.x2[i]!, land.y2[i]!];
    tree.add(Math.min(ax, bx), Math.min(ay, by), Math.max(ax, bx), Math.max(ay, by));
  }
  tree.finish();
  return tree;
}

/** Metres on the ground at a latitude for a metre of the plane: the ratio of the parallels' radii. */
function groundPerPlane(middle: Position, lat: number): number {
  return parallelRadiusM(lat * RAD_PER_DEG) / parallelRadiusM(middle.lat * RAD_PER_DEG);
}
