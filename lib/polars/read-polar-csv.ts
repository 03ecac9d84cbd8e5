import type { Polar } from '@/lib/polars/polar';
import type { PolarFinding } from '@/lib/polars/polar-finding';
import { assemblePolar } from '@/lib/polars/assemble-polar';
import { readPolarLines } from '@/lib/polars/read-polar-lines';

export type PolarReading = { readonly polar: Polar } | { readonly findings: readonly PolarFinding[] };

/** More would not be read by anybody. */
const MOST_FINDINGS = 50;

/**
 * Reads a polar in long form: the header true_wind_speed_kn,true_wind_angle_deg,boat_speed_kn (in any order), then a
 * line for each wind and angle, in any order. Every wind needs every angle: holes are named, nothing is guessed.
 */
export function readPolarCsv(text: string): PolarReading {
  const { cells, findings } = readPolarLines(text);
  if (findings.length > 0) return { findings: findings.slice(0, MOST_FINDINGS) };
  const assembled = assemblePolar(cells);
  return 'polar' in assembled ? assembled : { findings: assembled.findings.slice(0, MOST_FINDINGS) };
}
