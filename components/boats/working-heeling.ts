import type { PressureRule, Reef } from '@/lib/rigging/craft';
import { uprightHeelingMomentNm } from '@/lib/rigging/heeling-moment';
import { pressureCoefficient, pressurePa } from '@/lib/rigging/pressure';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { AIR_KG_M3, GRAVITY_M_S2, M_S_PER_KNOT } from '@/lib/units/constants';
import type { Knots } from '@/lib/units/quantities';
import { figure, kgM, newtonM } from './show';
import type { WorkingStep } from './working';

/** C, where it is hidden in the shed's rule. */
export function workingCoefficient(rule: PressureRule): readonly WorkingStep[] {
  if ('coefficient' in rule) return [];
  const speed = `(${figure(rule.atKn, 2)} kn × ${M_S_PER_KNOT.toFixed(4)} m/s a knot)²`;
  return [
    {
      what: 'Coefficient C of the rule used in the shed',
      equation: 'C = p · g ÷ (½ · ρa · V²)',
      numbers: `${figure(rule.kgPerM2, 2)} kg/m² × ${GRAVITY_M_S2} m/s² ÷ (½ × ${AIR_KG_M3} kg/m³ × ${speed})`,
      result: figure(pressureCoefficient(rule), 3),
      source: `the owner’s rule, ${figure(rule.kgPerM2, 2)} kg/m² at ${figure(rule.atKn, 2)} kn`,
    },
  ];
}

/** Heeling moment of a reef, upright, in an apparent wind. */
export function workingHeeling(sheet: BoatSheet, reef: Reef, apparentKn: Knots): readonly WorkingStep[] {
  const coefficient = pressureCoefficient(sheet.pressure);
  const pascals = pressurePa(coefficient, apparentKn);
  const momentNm = uprightHeelingMomentNm(sheet, reef, apparentKn);
  const lever = `(${figure(reef.centreHeightM, 3)} m − ${sheet.centreOfLateralResistanceM < 0 ? `(${figure(sheet.centreOfLateralResistanceM, 3)} m)` : `${figure(sheet.centreOfLateralResistanceM, 3)} m`})`;
  return [
    ...workingCoefficient(sheet.pressure),
    {
      what: 'Pressure on the sail, p',
      equation: '½ · ρa · Va² · C, the full apparent wind',
      numbers: `½ × ${AIR_KG_M3} kg/m³ × (${figure(apparentKn, 2)} kn × ${M_S_PER_KNOT.toFixed(4)} m/s a knot)² × ${figure(coefficient, 3)}`,
      result: `${figure(pascals, 1)} Pa (${figure(pascals / GRAVITY_M_S2, 2)} kg/m²)`,
      source: 'dynamic pressure; air of ISO 2533 at sea level',
    },
    {
      what: 'Heeling moment upright, HM0',
      equation: 'p · A · (zCE − zCLR)',
      numbers: `${figure(pascals, 1)} Pa × ${figure(reef.areaM2, 2)} m² × ${lever}`,
      result: `${newtonM(momentNm)} (${kgM(momentNm)})`,
      source: 'pressure times area times lever, the trade’s method by hand',
    },
  ];
}
