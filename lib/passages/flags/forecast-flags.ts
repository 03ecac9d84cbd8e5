import { flagAt } from '@/lib/passages/flags/leg-context';
import type { Flag, Passage } from '@/lib/passages/passage';
import { MS_PER_HOUR } from '@/lib/units/constants';
import type { Hours } from '@/lib/units/quantities';

/** Older than this when asked, a forecast no longer carries a verdict. Seamanship judgement without a source. */
export const OLD_FORECAST_H: Hours = 12;

/** Age of the forecast when the question is asked; null where no issue time was given. */
export function forecastAgeH({ wind, asOf }: Passage): Hours | null {
  return wind.issuedAt === undefined ? null : (asOf - wind.issuedAt) / MS_PER_HOUR;
}

export function isForecastOld(passage: Passage): boolean {
  const age = forecastAgeH(passage);
  return age !== null && age > OLD_FORECAST_H;
}

export function forecastFlags(passage: Passage): Flag[] {
  const ageHours = forecastAgeH(passage);
  if (ageHours === null) return [flagAt('forecast-age-unknown', 'caution', null)];
  return ageHours > OLD_FORECAST_H ? [flagAt('forecast-old', 'danger', null, { ageHours })] : [];
}
