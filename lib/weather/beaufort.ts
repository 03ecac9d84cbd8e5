import type { Knots } from '@/lib/units/quantities';

/** Strongest whole knots of forces 0 to 11. Source: WMO-No. 306, code table 1100, in knots. */
const STRONGEST_KN = [0, 3, 6, 10, 16, 21, 27, 33, 40, 47, 55, 63] as const;

/** Beaufort force, 0 to 12, of a mean wind. The table knows whole knots only, so the wind is rounded to them first. */
export function beaufortForce(meanKn: Knots): number {
  const whole = Math.round(meanKn);
  const force = STRONGEST_KN.findIndex((strongest) => whole <= strongest);
  return force < 0 ? 12 : force;
}
