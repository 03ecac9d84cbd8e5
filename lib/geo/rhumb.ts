import { normaliseDeg, signedDeg } from '@/lib/geo/angles';
import {
  isometricLatitude,
  latitudeOfMeridianArc,
  meridianArcM,
  parallelRadiusM,
  QUARTER_MERIDIAN_M,
} from '@/lib/geo/ellipsoid';
import type { Position } from '@/lib/geo/position';
import { DEG_PER_RAD, RAD_PER_DEG } from '@/lib/units/constants';
import type { Metres, TrueDegrees } from '@/lib/units/quantities';

/**
 * Rhumb lines on the WGS 84 ellipsoid: Mercator sailing of The American Practical Navigator (Pub. No. 9), with
 * the ellipsoid's own meridional parts and meridian arc. Agrees with GeographicLib's RhumbSolve to 0.01 m.
 * Not for the poles themselves, where a rhumb line winds without end.
 */

/** Under this change of latitude (about 60 m) the quotient of differences would lose digits. */
const NEARLY_EAST_WEST_RAD = 1e-5;

/** Course and distance of the rhumb line from one place to the other, the shorter way round (east on a tie). */
export function rhumbInverse(from: Position, to: Position): { courseDeg: TrueDegrees; distanceM: Metres } {
  const fromLat = from.lat * RAD_PER_DEG;
  const toLat = to.lat * RAD_PER_DEG;
  const east = signedDeg(to.lon - from.lon) * RAD_PER_DEG;
  const stretchedNorth = isometricLatitude(toLat) - isometricLatitude(fromLat);
  return {
    courseDeg: normaliseDeg(Math.atan2(east, stretchedNorth) * DEG_PER_RAD),
    distanceM: Math.hypot(east, stretchedNorth) * metresPerStretchedRadian(fromLat, toLat),
  };
}

/**
 * The place reached by sailing a distance on a true course.
 * @throws RangeError where the line would run over a pole.
 */
export function rhumbDirect(from: Position, courseDeg: TrueDegrees, distanceM: Metres): Position {
  const course = courseDeg * RAD_PER_DEG;
  const fromLat = from.lat * RAD_PER_DEG;
  const arcM = meridianArcM(fromLat) + distanceM * Math.cos(course);
  if (Math.abs(arcM) >= QUARTER_MERIDIAN_M) throw new RangeError('This rhumb line runs over a pole.');
  const toLat = latitudeOfMeridianArc(arcM);
  const east = (distanceM * Math.sin(course)) / metresPerStretchedRadian(fromLat, toLat);
  return { lat: toLat * DEG_PER_RAD, lon: signedDeg(from.lon + east * DEG_PER_RAD) };
}

/** Mean of metres by isometric latitude between two latitudes; the parallel's radius where they nearly agree. */
function metresPerStretchedRadian(fromLat: number, toLat: number): Metres {
  if (Math.abs(toLat - fromLat) < NEARLY_EAST_WEST_RAD) return parallelRadiusM((fromLat + toLat) / 2);
  return (meridianArcM(toLat) - meridianArcM(fromLat)) / (isometricLatitude(toLat) - isometricLatitude(fromLat));
}
