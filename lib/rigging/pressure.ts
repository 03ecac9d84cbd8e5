import type { PressureRule } from '@/lib/rigging/craft';
import { AIR_KG_M3, GRAVITY_M_S2, M_S_PER_KNOT } from '@/lib/units/constants';
import type { Knots, Pascals } from '@/lib/units/quantities';

/**
 * C of the owner's rule: given as it is, or hidden in "so many kg/m² at so many knots", C = p·g/(½·ρa·V²).
 * Source: docs/model.md §3.
 */
export function pressureCoefficient(rule: PressureRule): number {
  if ('coefficient' in rule) return rule.coefficient;
  return (rule.kgPerM2 * GRAVITY_M_S2) / pressurePa(1, rule.atKn);
}

/**
 * Pressure on the sail, p = ½·ρa·Va²·C, of the full apparent wind at any angle. With C = 1 it is the dynamic
 * pressure. Source: Bernoulli, air of ISO 2533 at sea level; docs/model.md §3.
 */
export function pressurePa(coefficient: number, apparentWindKn: Knots): Pascals {
  return 0.5 * AIR_KG_M3 * (apparentWindKn * M_S_PER_KNOT) ** 2 * coefficient;
}
