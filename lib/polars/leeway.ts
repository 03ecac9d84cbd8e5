import type { Leeway } from '@/lib/polars/polar';
import type { Degrees } from '@/lib/units/quantities';

/**
 * Leeway at a true wind angle of the heading, 0–180: the water track lies that much further off the wind than the
 * heading. One value for all, or by angle: linear between, constant beyond the first and last. Source: docs/model.md §5.
 */
export function leewayDegAt(leeway: Leeway, angleDeg: Degrees): Degrees {
  if (typeof leeway === 'number') return leeway;
  const rows = leeway as Exclude<Leeway, Degrees>;
  const angle = Math.abs(angleDeg);
  const next = rows.findIndex((row) => row.angleDeg >= angle);
  if (next < 0) return rows[rows.length - 1]?.leewayDeg ?? 0;
  const upper = rows[next]!;
  const lower = rows[next - 1];
  if (!lower) return upper.leewayDeg;
  const share = (angle - lower.angleDeg) / (upper.angleDeg - lower.angleDeg);
  return lower.leewayDeg + (upper.leewayDeg - lower.leewayDeg) * share;
}
