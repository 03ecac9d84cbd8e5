import geomagnetism from 'geomagnetism';
import { normaliseDeg } from '@/lib/geo/angles';
import type { Position } from '@/lib/geo/position';
import type { Degrees, EpochMs, MagneticDegrees, TrueDegrees } from '@/lib/units/quantities';

/**
 * Magnetic variation (declination) at sea level, east positive, from the World Magnetic Model of that date: WMM2025
 * from November 2024 to November 2029. About 0.5° of error is usual, more near the magnetic poles; ships, cables and
 * rock are not in it. Before December 2014 and after November 2029 the nearest model's end is used.
 * Source: World Magnetic Model report (NOAA NCEI and BGS), through the package geomagnetism.
 */
export function variationDeg(place: Position, time: EpochMs): Degrees {
  const inRange = Math.min(Math.max(time, FIRST_MS), LAST_MS);
  return geomagnetism.model(new Date(inRange)).point([place.lat, place.lon]).decl;
}

const FIRST_MS = Date.UTC(2014, 11, 16);
const LAST_MS = Date.UTC(2029, 10, 12);

/** A true direction by the compass without deviation: easterly variation is taken off. */
export function toMagnetic(trueDeg: TrueDegrees, variation: Degrees): MagneticDegrees {
  const turned: number = normaliseDeg(trueDeg - variation);
  return turned;
}
