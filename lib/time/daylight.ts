import { getPosition } from 'suncalc';
import { DEG_PER_RAD, RAD_PER_DEG } from '@/lib/units/constants';
import type { Degrees, EpochMs } from '@/lib/units/quantities';

/** Civil twilight ends with the sun's centre this far under the horizon, refraction left out. */
export const CIVIL_TWILIGHT_DEG: Degrees = -6;

/**
 * Height of the sun's centre over the horizon as it stands, without refraction (within 0.01°), and whether it is
 * dark: past civil twilight. Source: Meeus, Astronomical Algorithms, as in suncalc 2.
 */
export function daylightAt(
  place: { readonly lat: number; readonly lon: number },
  time: EpochMs,
): { sunAltitudeDeg: Degrees; isDark: boolean } {
  const apparentDeg = getPosition(new Date(time), place.lat, place.lon).altitude;
  const sunAltitudeDeg = apparentDeg - refractionDeg(apparentDeg);
  return { sunAltitudeDeg, isDark: sunAltitudeDeg < CIVIL_TWILIGHT_DEG };
}

/** Refraction that suncalc adds at and under the horizon, from its own form of Meeus 16.4 at height zero. */
const REFRACTION_AT_HORIZON_DEG = (0.0002967 / Math.tan(0.00312536 / 0.08901179)) * DEG_PER_RAD;

/** Refraction by apparent height: Bennett's formula (Meeus 16.3) over the horizon, suncalc's constant under it. */
function refractionDeg(apparentDeg: Degrees): Degrees {
  if (apparentDeg <= REFRACTION_AT_HORIZON_DEG) return REFRACTION_AT_HORIZON_DEG;
  return 1 / Math.tan((apparentDeg + 7.31 / (apparentDeg + 4.4)) * RAD_PER_DEG) / 60;
}
