import { signedDeg } from '@/lib/geo/angles';
import { isometricLatitude, parallelRadiusM } from '@/lib/geo/ellipsoid';
import type { Position } from '@/lib/geo/position';
import type { Vector } from '@/lib/geo/vector';
import { RAD_PER_DEG } from '@/lib/units/constants';

/**
 * From one place to another on the Mercator plane of WGS 84, in metres at the scale of the first place. Rhumb lines
 * are straight there and angles are true, so that laylines and corridors can be worked as plane geometry; near the
 * first place lengths are those on the ground. Source: Snyder, USGS PP 1395, eq. 7-6 and 7-7.
 */
export function mercatorOffsetM(from: Position, to: Position): Vector {
  const radiusM = parallelRadiusM(from.lat * RAD_PER_DEG);
  const stretchedNorth = isometricLatitude(to.lat * RAD_PER_DEG) - isometricLatitude(from.lat * RAD_PER_DEG);
  return { east: signedDeg(to.lon - from.lon) * RAD_PER_DEG * radiusM, north: stretchedNorth * radiusM };
}
