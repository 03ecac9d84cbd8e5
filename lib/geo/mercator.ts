import type { Metres } from '@/lib/units/quantities';
import { RAD_PER_DEG } from '@/lib/units/constants';
import type { Vector } from '@/lib/geo/vector';

/** WGS 84: equatorial radius and first eccentricity squared. NIMA TR8350.2. */
const EQUATORIAL_RADIUS_M = 6378137;
const FLATTENING = 1 / 298.257223563;
const ECCENTRICITY_SQ = FLATTENING * (2 - FLATTENING);
const ECCENTRICITY = Math.sqrt(ECCENTRICITY_SQ);

interface Position {
  readonly lat: number;
  readonly lon: number;
}

/** Isometric latitude ψ in radians; the northing of the ellipsoidal Mercator projection. Snyder, USGS PP 1395, eq. 7-7. */
function isometricLatitude(latDeg: number): number {
  const sin = Math.sin(latDeg * RAD_PER_DEG);
  return Math.atanh(sin) - ECCENTRICITY * Math.atanh(ECCENTRICITY * sin);
}

/** Radius of the parallel, N·cosφ: metres on the ground for one radian of the projection. */
function parallelRadiusM(latDeg: number): Metres {
  const sin = Math.sin(latDeg * RAD_PER_DEG);
  return (EQUATORIAL_RADIUS_M * Math.cos(latDeg * RAD_PER_DEG)) / Math.sqrt(1 - ECCENTRICITY_SQ * sin * sin);
}

/**
 * From one place to another on the Mercator plane, in metres at the scale of the first place. Rhumb lines are
 * straight there and angles are true, so that laylines and corridors can be worked as plane geometry; near the
 * first place lengths are those on the ground.
 */
export function mercatorOffsetM(from: Position, to: Position): Vector {
  const radius = parallelRadiusM(from.lat);
  const deltaLon = ((((to.lon - from.lon + 180) % 360) + 360) % 360) - 180;
  return {
    east: deltaLon * RAD_PER_DEG * radius,
    north: (isometricLatitude(to.lat) - isometricLatitude(from.lat)) * radius,
  };
}
