import { getTimes } from 'suncalc';
import { localToUtc } from '@/lib/time/zoned';
import type { EpochMs } from '@/lib/units/quantities';

/** Instants of one local day; null where the sun does not come to that height on it. */
export interface SunTimes {
  readonly nauticalDawn: EpochMs | null;
  readonly civilDawn: EpochMs | null;
  readonly sunrise: EpochMs | null;
  readonly sunset: EpochMs | null;
  readonly civilDusk: EpochMs | null;
  readonly nauticalDusk: EpochMs | null;
}

/**
 * Sun times of a local date such as 2026-06-21 in an IANA zone: rise and set at −0.833°, civil twilight at −6°,
 * nautical at −12°. Within 30 s against almanacs at middle latitudes. Null where date or zone do not exist.
 * Local noon is handed on, since a day of UTC may hold the sunset of the local day before.
 * Source: Meeus, Astronomical Algorithms, chapter 15, as in suncalc 2.
 */
export function sunTimesOn(
  place: { readonly lat: number; readonly lon: number },
  localDate: string,
  zone: string,
): SunTimes | null {
  const noon = localToUtc(`${localDate}T12:00`, zone);
  if ('problem' in noon) return null;
  const times = getTimes(new Date(noon.epochMs), place.lat, place.lon);
  return {
    nauticalDawn: instantOf(times.nauticalDawn),
    civilDawn: instantOf(times.dawn),
    sunrise: instantOf(times.sunrise),
    sunset: instantOf(times.sunset),
    civilDusk: instantOf(times.dusk),
    nauticalDusk: instantOf(times.nauticalDusk),
  };
}

function instantOf(date: Date | null): EpochMs | null {
  return date === null || Number.isNaN(date.getTime()) ? null : date.getTime();
}
