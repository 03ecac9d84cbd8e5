import type { Metres } from '@/lib/units/quantities';

/**
 * The WGS 84 ellipsoid and its latitudes. Latitudes are in radians here.
 * Constants: NGA.STND.0036 (World Geodetic System 1984).
 */
const EQUATORIAL_RADIUS_M = 6_378_137;
const FLATTENING = 1 / 298.257223563;
const ECCENTRICITY_SQUARED = FLATTENING * (2 - FLATTENING);
const ECCENTRICITY = Math.sqrt(ECCENTRICITY_SQUARED);
/** Third flattening n = (a - b)/(a + b). */
const N = FLATTENING / (2 - FLATTENING);
const MEAN_MERIDIAN_RADIUS_M = (EQUATORIAL_RADIUS_M / (1 + N)) * (1 + N ** 2 / 4 + N ** 4 / 64);
/** Coefficients of sin 2φ … sin 8φ in the meridian arc, Helmert's series in n cut after n⁴ (under 1 µm). */
const ARC = [
  (-3 / 2) * (N - N ** 3 / 8),
  (15 / 16) * (N ** 2 - N ** 4 / 4),
  (-35 / 48) * N ** 3,
  (315 / 512) * N ** 4,
] as const;

/** Length of a quarter meridian, equator to pole. */
export const QUARTER_MERIDIAN_M: Metres = (MEAN_MERIDIAN_RADIUS_M * Math.PI) / 2;

/** Isometric latitude ψ: the stretched latitude in which rhumb lines are straight. Snyder, USGS PP 1395, eq. 3-7. */
export function isometricLatitude(lat: number): number {
  return Math.asinh(Math.tan(lat)) - ECCENTRICITY * Math.atanh(ECCENTRICITY * Math.sin(lat));
}

/** Distance along the meridian from the equator, metres. Helmert (1880), as in Karney (2011), Transverse Mercator. */
export function meridianArcM(lat: number): Metres {
  const series = ARC.reduce((sum, coefficient, k) => sum + coefficient * Math.sin(2 * (k + 1) * lat), 0);
  return MEAN_MERIDIAN_RADIUS_M * lat + (EQUATORIAL_RADIUS_M / (1 + N)) * series;
}

/** Latitude of a meridian arc, by Newton's rule: it doubles its digits each turn and starts within 0.003. */
export function latitudeOfMeridianArc(arcM: Metres): number {
  let lat = arcM / MEAN_MERIDIAN_RADIUS_M;
  for (let turn = 0; turn < 4; turn += 1) lat -= (meridianArcM(lat) - arcM) / meridianRadiusM(lat);
  return lat;
}

/** Radius of the parallel, N·cosφ: also the slope of the meridian arc by isometric latitude. */
export function parallelRadiusM(lat: number): Metres {
  return (EQUATORIAL_RADIUS_M * Math.cos(lat)) / Math.sqrt(1 - ECCENTRICITY_SQUARED * Math.sin(lat) ** 2);
}

function meridianRadiusM(lat: number): Metres {
  return (EQUATORIAL_RADIUS_M * (1 - ECCENTRICITY_SQUARED)) / (1 - ECCENTRICITY_SQUARED * Math.sin(lat) ** 2) ** 1.5;
}
