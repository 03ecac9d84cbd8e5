import type { Polar } from '@/lib/polars/polar';

export const POLAR_CSV_COLUMNS = ['true_wind_speed_kn', 'true_wind_angle_deg', 'boat_speed_kn'] as const;

/** The polar as CSV in long form: one line a wind and angle, knots and degrees, point as decimal sign. */
export function writePolarCsv(polar: Polar): string {
  const lines = polar.windSpeedsKn.flatMap((windKn, wind) =>
    polar.windAnglesDeg.map((angleDeg, angle) => `${windKn},${angleDeg},${polar.speedsKn[wind]![angle]!}`),
  );
  return [POLAR_CSV_COLUMNS.join(','), ...lines, ''].join('\n');
}
